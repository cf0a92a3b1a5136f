package tunwarden.serial;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.modbus.Blocks;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Polling;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.text.TextQuestion;

/** One instrument that is asked: what is bound to it, and the questions that tell it. */
final class AskedUnit {
  private static final int NO_SUCH_ADDRESS = 2;

  private final List<Binding> bindings;
  private final Profile profile;
  private final int slave;
  private Blocks blocks = Blocks.JOINED;
  private List<? extends Question> questions;

  /** All bindings are of one profile and one address. */
  AskedUnit(List<Binding> bindings) {
    this.bindings = List.copyOf(bindings);
    this.profile = bindings.get(0).profile();
    this.slave = bindings.get(0).slave();
    this.questions = plan();
  }

  private List<? extends Question> plan() {
    List<Field> fields = bindings.stream().map(Binding::field).toList();
    if (profile.speaks() == Speaks.MODBUS_RTU) {
      return blocks.questions(slave, fields);
    }
    Set<String> texts = new LinkedHashSet<>();
    fields.forEach(field -> texts.add(field.number().send()));
    List<TextQuestion> asked = new ArrayList<>();
    texts.forEach(text -> asked.add(new TextQuestion(profile, text, slave)));
    return asked;
  }

  /**
   * Takes in a refusal. Where registers beside the wanted ones may have caused it, fewer are asked
   * for from now on.
   *
   * @return whether it will be asked otherwise now
   */
  boolean humbled(Result.Refusal refusal) {
    boolean modest = blocks == Blocks.BARE || profile.speaks() != Speaks.MODBUS_RTU;
    if (modest || refusal.code() != NO_SUCH_ADDRESS) {
      return false;
    }
    List<? extends Question> before = questions;
    blocks = blocks.afterRefusal();
    questions = plan();
    return !questions.equals(before) || humbled(refusal);
  }

  List<Binding> bindings() {
    return bindings;
  }

  List<? extends Question> questions() {
    return questions;
  }

  private Polling polling() {
    return profile.polling();
  }

  /** The shortest period that anything bound here asks for. */
  long periodNanos() {
    return bindings.stream().mapToLong(b -> b.trim().period().toNanos()).min().orElseThrow();
  }

  long timeoutNanos() {
    return polling().timeout().toNanos();
  }

  long turnaroundNanos() {
    return polling().turnaround().toNanos();
  }

  int tries() {
    return 1 + polling().retries();
  }
}
