package tunwarden.screen;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.alarm.Alarm;
import tunwarden.screen.model.Desk;
import tunwarden.screen.model.Look;

/** A desk that does nothing but remember what was asked of it. */
public final class RecordingDesk implements Desk {
  private final List<String> asked = new ArrayList<>();

  /** What was asked so far, in order. */
  public List<String> asked() {
    return asked;
  }

  private String noted(String what) {
    asked.add(what);
    return "";
  }

  @Override
  public String acknowledge(Alarm alarm, String word) {
    return noted("acknowledge " + alarm.vessel() + " " + alarm.kind() + " '" + word + "'");
  }

  @Override
  public String shelve(Alarm alarm, String reason, Instant until) {
    return noted("shelve " + alarm.vessel() + " " + alarm.kind() + " '" + reason + "' " + until);
  }

  @Override
  public String unshelve(Alarm alarm) {
    return noted("unshelve " + alarm.vessel() + " " + alarm.kind());
  }

  @Override
  public String note(String vessel, String text) {
    return noted("note " + vessel + " '" + text + "'");
  }

  @Override
  public String labValue(String vessel, double dissolvedKgPerM3, double u95KgPerM3) {
    return noted(
        String.format(Locale.ROOT, "lab %s %.3f %.3f", vessel, dissolvedKgPerM3, u95KgPerM3));
  }

  @Override
  public String report(String vessel) {
    noted("report " + vessel);
    return "The report of " + vessel + " is being written.";
  }

  @Override
  public String stopWork() {
    return noted("stop work");
  }

  @Override
  public void remember(Look look) {
    noted("remember " + look.units().pressure() + " " + look.theme() + " " + look.glyphs());
  }

  @Override
  public String pause(boolean paused) {
    return noted("pause " + paused);
  }

  @Override
  public String pace(double pace) {
    return noted(String.format(Locale.ROOT, "pace %.0f", pace));
  }

  @Override
  public String seek(Instant time) {
    return noted("seek " + time);
  }

  @Override
  public String step() {
    return noted("step");
  }

  @Override
  public String mark(String text) {
    return noted("mark '" + text + "'");
  }
}
