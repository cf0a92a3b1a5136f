package tunwarden.app.reckon;

import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.room.ExposureLimit;
import tunwarden.forecast.room.RoomAir;
import tunwarden.forecast.vent.RoomAfter;
import tunwarden.forecast.vent.Stage;
import tunwarden.forecast.vent.Vent;
import tunwarden.forecast.vent.VentAnswer;
import tunwarden.forecast.vent.VentQuestion;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.units.Pressure;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Room;

/** A vent tried before anyone turns a handle. */
@Command(
    name = "vent",
    description = "What leaves a vessel that is vented, what follows, and what the room comes to.")
final class VentTrial extends AnswerCommand {
  private static final double G_PER_KG = 1000;
  private static final double L_PER_M3 = 1000;
  private static final double USUAL_KD = 0.6;

  @Option(
      names = "--to",
      required = true,
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Pressure to let it down to, as '0.2 bar'.")
  private Pressure to;

  @Option(
      names = "--orifice",
      paramLabel = "LENGTH",
      converter = Convert.ToDiameter.class,
      description = "Diameter of what the gas leaves through, for the time it takes.")
  private Double orificeM;

  @Option(
      names = "--kd",
      paramLabel = "NUMBER",
      converter = Convert.ToCoefficient.class,
      description = "Its coefficient of discharge. Default: 0.6.")
  private Double kd;

  @Option(
      names = "--room",
      paramLabel = "VOLUME",
      converter = Convert.ToCubicMetres.class,
      description = "Free volume of the room the gas goes into.")
  private Double roomM3;

  @Option(
      names = "--air-changes",
      paramLabel = "RATE",
      converter = Convert.ToPerSecond.class,
      description = "Ventilation of the room, as '2 /h'. Default: none.")
  private Double airChangesPerS;

  @Option(
      names = "--foam-bound",
      paramLabel = "SHARE",
      converter = Convert.ToShare.class,
      description = "Highest supersaturation in the staged plan. Default: 50 %%.")
  private Double foamBound;

  @Mixin private PresentOptions present;

  @Override
  void fill(AnswerSheet sheet) {
    Ensemble ensemble = present.ensemble();
    VentQuestion question = question();
    question
        .fault(ensemble.present())
        .ifPresent(
            sentence -> {
              throw new BadInputException(sentence);
            });
    VentAnswer answer = Vent.of(ensemble, question);
    gas(sheet, answer);
    answer.blowdownS().ifPresent(s -> sheet.number("blowdown_s", "takes", s.middle(), u95(s), "s"));
    answer.room().ifPresent(room -> room(sheet, room));
    plan(sheet, answer);
    present.model(sheet, ensemble, ", isentropic orifice, well-mixed room");
    answer.cautions().forEach(caution -> sheet.caution(caution.text()));
    VentAnswer.ASSUMPTIONS.forEach(sheet::assume);
  }

  private VentQuestion question() {
    if (kd != null && orificeM == null) {
      throw new BadInputException("--kd needs an --orifice, as '--orifice 15mm'");
    }
    if (airChangesPerS != null && roomM3 == null) {
      throw new BadInputException("--air-changes needs a --room, as '--room 180m3'");
    }
    if (roomM3 != null && !(roomM3 > 0)) {
      throw new BadInputException("--room: a room needs a volume above zero");
    }
    return new VentQuestion(
        present.gaugePa(to),
        Optional.ofNullable(orificeM)
            .map(diameter -> new ReliefOrifice(diameter, kd == null ? USUAL_KD : kd)),
        Optional.ofNullable(roomM3)
            .map(volume -> new Room(volume, airChangesPerS == null ? 0 : airChangesPerS)),
        foamBound == null ? VentQuestion.USUAL_BOUND : foamBound);
  }

  private static void gas(AnswerSheet sheet, VentAnswer answer) {
    Spread once = answer.once().kg();
    sheet.number(
        "vented_at_once_g", "at once", G_PER_KG * once.middle(), G_PER_KG * u95(once), "g of gas");
    Spread normal = answer.once().normalM3();
    sheet.json("vented_at_once_normal_l", L_PER_M3 * normal.middle(), L_PER_M3 * u95(normal));
    Spread follows = answer.followsKg();
    String within =
        "g from the liquid if held open, most of it in "
            + time(answer.followTime().low())
            + " to "
            + answer.followTime().high().map(VentTrial::time).orElse("no end of time");
    sheet.number(
        "released_if_held_g",
        "to follow",
        G_PER_KG * follows.middle(),
        G_PER_KG * u95(follows),
        within);
    sheet.hidden("release_low_h", hours(answer.followTime().low()));
    sheet.hidden("release_h", hours(answer.followTime().middle()));
    answer.followTime().high().ifPresent(high -> sheet.hidden("release_high_h", hours(high)));
    Spread rebound = answer.reboundPaGauge();
    sheet.gauge("rebound_bar_g", "back to", rebound.middle(), u95(rebound));
    Spread excess = answer.supersaturation();
    sheet.json("supersaturation", excess.middle(), u95(excess));
    sheet.line(
        "supersaturated",
        Display.number(100 * excess.middle(), 0)
            + " ± "
            + Display.number(100 * u95(excess), 0)
            + " % on arrival");
  }

  private static void room(AnswerSheet sheet, RoomAfter room) {
    ppm(sheet, "room_ppm", "room at once", room.onceCo2(), "ppm CO2, mixed well");
    ppm(sheet, "room_ppm_if_held", "room if held", room.heldCo2(), "ppm CO2 without ventilation");
    room.ventilatedCo2()
        .ifPresent(
            peak ->
                ppm(
                    sheet,
                    "room_peak_ppm_ventilated",
                    "ventilated",
                    peak,
                    "ppm CO2 at the worst with its air changes"));
    sheet.hidden("room_oxygen_percent", 100 * room.leastOxygen());
    List<Object> limits = new ArrayList<>();
    for (ExposureLimit limit : ExposureLimit.IN_FORCE) {
      Map<String, Object> entry = new LinkedHashMap<>();
      entry.put("body", limit.body());
      entry.put("name", limit.name());
      entry.put("ppm", limit.ppm());
      entry.put("averaging", limit.averaging());
      entry.put("source", limit.source());
      limits.add(entry);
    }
    sheet.plain(
        "exposure_limits",
        limits,
        "limits",
        "5000 ppm over 8 h, 15000 (UK) or 30000 over 15 min, 40000 dangerous at once");
  }

  private static void ppm(AnswerSheet sheet, String key, String label, Spread share, String unit) {
    double middle = RoomAir.ppm(share.middle());
    sheet.json(key, middle, RoomAir.ppm(u95(share)));
    sheet.line(
        label,
        Display.number(middle, 0)
            + " ± "
            + Display.number(RoomAir.ppm(u95(share)), 0)
            + " "
            + unit);
  }

  private static void plan(AnswerSheet sheet, VentAnswer answer) {
    List<Object> steps = new ArrayList<>();
    for (Stage stage : answer.plan().stages()) {
      Map<String, Object> step = new LinkedHashMap<>();
      step.put("to_bar_g", stage.toPaGauge() / 1e5);
      step.put("supersaturation", stage.supersaturation());
      step.put("at_once_g", G_PER_KG * stage.leavesAtOnceKg());
      step.put("follows_g", G_PER_KG * stage.followsKg());
      stage
          .hold()
          .ifPresent(
              hold -> {
                step.put("hold_low_h", hours(hold.low()));
                step.put("hold_h", hours(hold.middle()));
                hold.high().ifPresent(high -> step.put("hold_high_h", hours(high)));
              });
      steps.add(step);
      if (answer.plan().stages().size() > 1) {
        sheet.line(steps.size() == 1 ? "in steps" : "", words(sheet.display(), stage));
      }
    }
    if (!answer.plan().isComplete()) {
      sheet.line("", "and so on: too many steps to follow; allow a higher bound");
    }
    sheet.hidden("plan", steps);
  }

  private static String words(Display display, Stage stage) {
    String hold =
        stage
            .hold()
            .map(
                range ->
                    ", hold there "
                        + time(range.low())
                        + range.high().map(high -> " to " + time(high)).orElse(" or longer"))
            .orElse(", the target");
    return "to " + display.gauge(stage.toPaGauge()) + hold;
  }

  private static double hours(Duration duration) {
    return duration.toMillis() / 3.6e6;
  }

  private static String time(Duration duration) {
    double minutes = duration.toSeconds() / 60.0;
    if (minutes < 90) {
      return Display.number(minutes, 0) + " min";
    }
    return minutes < 60 * 48
        ? Display.number(minutes / 60, 0) + " h"
        : Display.number(minutes / 1440, 0) + " days";
  }

  private static double u95(Spread spread) {
    return PresentOptions.u95(spread);
  }
}
