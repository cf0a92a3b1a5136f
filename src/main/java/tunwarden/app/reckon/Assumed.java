package tunwarden.app.reckon;

import tunwarden.units.Display;
import tunwarden.vessel.Vessel;

/** What answers take for granted, in words that more than one of them uses. */
final class Assumed {
  private Assumed() {}

  /** At rest under that pressure. */
  static void equilibrium(AnswerSheet sheet, Vessel vessel) {
    sheet.assume("liquid and gas at rest with each other at that pressure and temperature");
    sheet.assume(gas(vessel));
  }

  /** What the headspace holds. */
  static String gas(Vessel vessel) {
    double air = vessel.contents().airPaAbsolute();
    String left =
        air > 0
            ? Display.METRIC.pressureDifference(air) + " of air left in it, to half of that"
            : "no air left in it";
    return "headspace: " + vessel.gas() + " and water vapour, " + left;
  }
}
