package tunwarden.serial;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tunwarden.reading.Fault;

/** What a person should know of a line and one value on it, most urgent first. */
public final class LinkWords {
  private LinkWords() {}

  /**
   * One line of text: the state of the port when it is not well, what is wrong with the value, its
   * true period, how often what has failed, the latest failure, and the last bytes.
   */
  public static String of(LinkHealth health, LinkHealth.Channel channel) {
    if (!health.state().isOpen()) {
      return health.detail().isEmpty() ? health.state().words() : health.detail();
    }
    List<String> words = new ArrayList<>();
    if (health.state() != LinkState.OPEN) {
      words.add(health.state().words());
    }
    if (channel.latest() instanceof Fault fault && !fault.detail().isEmpty()) {
      words.add(fault.detail());
    }
    if (Double.isFinite(channel.periodS())) {
      words.add(String.format(Locale.ROOT, "every %.1f s", channel.periodS()));
    }
    LinkHealth.Traffic traffic = health.traffic();
    for (Map.Entry<Trouble, Long> trouble : traffic.troubles().entrySet()) {
      words.add(trouble.getValue() + " × " + trouble.getKey().words());
    }
    if (!traffic.lastTrouble().isEmpty()) {
      words.add("last " + traffic.lastTrouble());
    }
    words.add("heard " + (traffic.bytes() == 0 ? "nothing" : traffic.lastBytes()));
    return String.join("; ", words);
  }
}
