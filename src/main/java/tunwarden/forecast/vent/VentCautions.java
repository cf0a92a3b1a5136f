package tunwarden.forecast.vent;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.forecast.Caution;
import tunwarden.forecast.room.ExposureLimit;
import tunwarden.forecast.room.RoomAir;

/** What to mind before opening a vent; only what this vent calls for. */
final class VentCautions {
  private static final double QUIET = 0.1;
  private static final double WORTH_SAYING_KG = 0.05;

  private VentCautions() {}

  static VentAnswer added(VentAnswer answer, VentQuestion question) {
    List<Caution> cautions = new ArrayList<>();
    addRoom(cautions, answer);
    addOxygen(cautions, answer);
    addFoam(cautions, answer, question);
    return new VentAnswer(
        answer.once(),
        answer.followsKg(),
        answer.followTime(),
        answer.reboundPaGauge(),
        answer.supersaturation(),
        answer.blowdownS(),
        answer.plan(),
        answer.room(),
        List.copyOf(cautions));
  }

  private static void addRoom(List<Caution> cautions, VentAnswer answer) {
    double co2Kg = answer.once().co2Kg().middle() + answer.followsKg().middle();
    if (co2Kg < WORTH_SAYING_KG) {
      return;
    }
    if (answer.room().isEmpty()) {
      cautions.add(
          new Caution(
              false,
              String.format(
                  Locale.ROOT,
                  "No room is described: held open, %.1f m³ of CO2 come out and lie low; lead it"
                      + " outdoors or air the room first.",
                  RoomAir.volumeM3(co2Kg))));
      return;
    }
    double once = RoomAir.ppm(answer.room().get().onceCo2().high());
    double held = RoomAir.ppm(answer.room().get().heldCo2().high());
    if (held <= ExposureLimit.DAY_PPM) {
      return;
    }
    boolean grave = ExposureLimit.NIOSH_IDLH.isExceededBy(held);
    cautions.add(
        new Caution(
            grave,
            String.format(
                Locale.ROOT,
                "Room without ventilation: up to %,.0f ppm CO2 at once, %,.0f if held open, and"
                    + " more near the floor (%s): %s",
                once,
                held,
                passed(held),
                grave
                    ? "lead the gas outdoors; nobody stays without a CO2 meter and breathing air."
                    : "run the ventilation and watch a CO2 meter.")));
  }

  private static String passed(double ppm) {
    if (ExposureLimit.NIOSH_IDLH.isExceededBy(ppm)) {
      return "immediately dangerous above 40,000";
    }
    return ppm > ExposureLimit.SHORT_PPM ? "lowest 15 min limit 15,000" : "8 h limit 5,000";
  }

  private static void addOxygen(List<Caution> cautions, VentAnswer answer) {
    answer
        .room()
        .filter(room -> room.leastOxygen() < ExposureLimit.LEAST_OXYGEN)
        .ifPresent(
            room ->
                cautions.add(
                    new Caution(
                        true,
                        String.format(
                            Locale.ROOT,
                            "Oxygen may fall to %.1f %%; where the gas is CO2 it kills before an"
                                + " oxygen alarm sounds.",
                            100 * room.leastOxygen()))));
  }

  private static void addFoam(List<Caution> cautions, VentAnswer answer, VentQuestion question) {
    double excess = answer.supersaturation().middle();
    if (excess <= QUIET) {
      return;
    }
    String likely =
        excess > 1
            ? "it will foam hard"
            : excess > question.foamBound() ? "it is likely to foam" : "it foams if disturbed";
    String steps =
        answer.plan().stages().size() > 1 ? "go down in the steps of the plan, " : "open slowly, ";
    cautions.add(
        new Caution(
            false,
            String.format(
                Locale.ROOT,
                "At the target the liquid holds %.0f %% more than at rest and %s: %sfoam blocks"
                    + " vents and relief valves.",
                100 * excess,
                likely,
                steps)));
  }
}
