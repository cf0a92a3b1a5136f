package tunwarden.screen;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmState;
import tunwarden.assess.Assessment;
import tunwarden.assess.History;
import tunwarden.assess.Margins;
import tunwarden.assess.Observed;
import tunwarden.assess.Rung;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Projection;
import tunwarden.forecast.Scenario;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.TrendPoint;
import tunwarden.forecast.WhatIf;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Instrument;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.ReplayStatus;
import tunwarden.screen.model.VesselBoard;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/**
 * Invented boards for looking at and testing the screen; the numbers are plausible, not computed.
 */
public final class Boards {
  /** The moment of every fixed board. */
  public static final Instant NOW = Instant.parse("2026-03-02T11:02:31Z");

  private static final double BAR = 1e5;
  private static final double ZERO_C = 273.15;

  private Boards() {}

  /** Three vessels of a small brewery that does not exist, one of them closing on its relief. */
  public static Board three(Origin origin, Instant now) {
    VesselBoard calm = vessel("FV2", "pale ale", 0.88, 4.2, now, List.of());
    VesselBoard near =
        vessel("BT1", "Märzen für den Hof", 1.33, 11.8, now, List.of(marginLow("BT1", now)));
    VesselBoard none = noRelief("CK4", "cask bitter", now);
    return board(origin, now, List.of(calm, near, none));
  }

  /** So many vessels with margins all over the place. */
  public static Board many(int count, Instant now) {
    List<VesselBoard> vessels = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      double bar = 0.2 + 1.1 * ((i * 7) % count) / count;
      vessels.add(vessel("V" + (i + 1), "batch " + (101 + i), bar, 2 + i % 9, now, List.of()));
    }
    return board(Origin.LIVE, now, vessels);
  }

  /** A board around given vessels. */
  public static Board board(Origin origin, Instant now, List<VesselBoard> vessels) {
    Optional<ReplayStatus> replay =
        origin == Origin.REPLAY ? Optional.of(replay(now)) : Optional.empty();
    return new Board(
        origin,
        now,
        ZoneOffset.UTC,
        Duration.ofSeconds(30),
        vessels,
        List.of(),
        instruments(now),
        replay,
        journal(now),
        Optional.empty());
  }

  /** The same board at another moment, nothing new having been read. */
  public static Board at(Board board, Instant now) {
    return new Board(
        board.origin(),
        now,
        board.zone(),
        board.staleAfter(),
        board.vessels(),
        board.stationAlarms(),
        board.instruments(),
        board.replay(),
        board.journal(),
        board.progress());
  }

  private static ReplayStatus replay(Instant now) {
    return new ReplayStatus(
        "cooling-lost.csv",
        60,
        false,
        now.minusSeconds(30_000),
        now.plusSeconds(20_000),
        now,
        "",
        List.of(
            new ReplayStatus.TimeMark(now.minusSeconds(5_000), "BT1", "vent"),
            new ReplayStatus.TimeMark(now.plusSeconds(9_000), "BT1", "lift")));
  }

  private static List<JournalEntry> journal(Instant now) {
    return List.of(
        new JournalEntry(now.minusSeconds(9_000), "", "start", "The station began."),
        new JournalEntry(
            now.minusSeconds(5_000), "BT1", "vent", "Pressure fell from 1.10 to 0.85 bar g."),
        new JournalEntry(now.minusSeconds(600), "FV2", "note", "Dry-hopped, 3 kg."),
        new JournalEntry(now.minusSeconds(60), "BT1", "alarm", "Margin low began."));
  }

  private static List<Instrument> instruments(Instant now) {
    return List.of(
        new Instrument(
            "FV2",
            Quantity.PRESSURE,
            "text-line",
            "/dev/ttyUSB0",
            Quality.GOOD,
            OptionalDouble.of(0.88 * BAR),
            Optional.of(now.minusSeconds(1)),
            8_312,
            2,
            ""),
        new Instrument(
            "BT1",
            Quantity.TEMPERATURE,
            "text-line",
            "/dev/ttyUSB1",
            Quality.PORT_GONE,
            OptionalDouble.empty(),
            Optional.of(now.minusSeconds(48)),
            7_900,
            14,
            "port gone, trying again in 3 s"));
  }

  /** A margin-low alarm nobody has seen. */
  public static Alarm marginLow(String vessel, Instant now) {
    return alarm(AlarmKind.MARGIN_LOW, vessel, AlarmState.UNACKNOWLEDGED, now);
  }

  /** An alarm of any kind. */
  public static Alarm alarm(AlarmKind kind, String vessel, AlarmState state, Instant now) {
    return new Alarm(
        kind,
        vessel,
        state,
        now.minusSeconds(60),
        now.minusSeconds(60),
        Optional.empty(),
        "0.06 bar left to the earliest lift, 4 % of the setting.",
        "Cool the vessel or vent it; do not touch the relief valve.",
        "",
        false);
  }

  /** A vessel with a relief setting of 1.5 bar. */
  public static VesselBoard vessel(
      String id, String title, double bar, double celsius, Instant now, List<Alarm> alarms) {
    Limits limits =
        new Limits(
            Optional.of(ReliefSetting.stated(1.5 * BAR, 0.1 * BAR)),
            OptionalDouble.of(2.0 * BAR),
            OptionalDouble.of(-0.02 * BAR));
    return vessel(described(id, title).withLimits(limits), bar, celsius, now, alarms);
  }

  private static Vessel described(String id, String title) {
    Vessel plain = Vessel.plain(id, 2.0, 1.8, Liquid.of(LiquidKind.BEER));
    return new Vessel(
        id,
        title,
        plain.volumeM3(),
        plain.fillM3(),
        plain.contents(),
        plain.closure(),
        plain.limits(),
        plain.orifice(),
        plain.site(),
        plain.warmToK(),
        plain.accuracy(),
        plain.prospects());
  }

  private static VesselBoard noRelief(String id, String title, Instant now) {
    return vessel(described(id, title), 0.32, 11.0, now, List.of());
  }

  private static VesselBoard vessel(
      Vessel vessel, double bar, double celsius, Instant now, List<Alarm> alarms) {
    Observed pressure = observed(bar * BAR, now);
    Observed temperature = observed(celsius + ZERO_C, now);
    Outlook outlook = outlook(vessel, bar, now);
    Optional<Margins> margins =
        vessel
            .limits()
            .relief()
            .map(r -> margins(r.earliestLiftPaGauge() - bar * BAR - 0.01 * BAR, r.setPaGauge()));
    Assessment assessment =
        new Assessment(
            vessel,
            now,
            pressure,
            temperature,
            Optional.of(estimate(bar, celsius, now)),
            margins,
            outlook,
            ladder(vessel, bar, outlook),
            List.of(),
            List.of());
    return new VesselBoard(
        assessment, alarms, history(bar, celsius, now), goingOn(vessel.id(), now));
  }

  /** One vessel has been losing gas since the morning. */
  private static List<Event> goingOn(String id, Instant now) {
    Instant since = now.minusSeconds(7_800);
    return id.equals("CK4")
        ? List.of(
            new Event(
                EventKind.LEAK, id, since, now, true, 0.62 * BAR, 0.55 * BAR, 0.021, 0.8, "falls"))
        : List.of();
  }

  private static Margins margins(double pa, double set) {
    return new Margins(pa, pa / set, 0.01 * BAR, OptionalDouble.of(9.4));
  }

  private static Observed observed(double value, Instant now) {
    return new Observed(
        OptionalDouble.of(value),
        Optional.of(now.minusSeconds(1)),
        Quality.GOOD,
        Duration.ofSeconds(1));
  }

  private static Estimate estimate(double bar, double celsius, Instant now) {
    return new Estimate(
        now.minusSeconds(1),
        bar * BAR,
        celsius + ZERO_C,
        5.31,
        0.14,
        5.52,
        0.93,
        0.04,
        0.03,
        Mode.SEALED,
        0.93,
        new Estimate.Spread(1e-6, 1e-5, 1e-4),
        0,
        "");
  }

  private static Outlook outlook(Vessel vessel, double bar, Instant now) {
    List<TrendPoint> trend = new ArrayList<>();
    for (int i = 0; i <= 48; i++) {
      double middle = bar + 0.07 * (1 - Math.exp(-i / 12.0));
      double spread = 0.004 * Math.sqrt(i);
      trend.add(
          new TrendPoint(
              now.plusSeconds(600L * i),
              middle * BAR,
              (middle - spread) * BAR,
              (middle + spread) * BAR));
    }
    TimeRange soon =
        new TimeRange(
            Duration.ofMinutes(320), Duration.ofMinutes(280), Optional.of(Duration.ofMinutes(390)));
    boolean rising = bar > 1.2 && vessel.limits().relief().isPresent();
    return new Outlook(
        List.of(
            projection(Scenario.TREND, "in 8 h", bar + 0.07),
            projection(Scenario.WARM, "warmed to 24 °C", bar + 0.41)),
        rising ? Optional.of(soon) : Optional.empty(),
        rising ? Optional.of(soon.low()) : Optional.empty(),
        Duration.ofHours(48),
        OptionalDouble.of(26.1 + ZERO_C),
        OptionalDouble.empty(),
        trend,
        List.of(
            new Caution(
                true, "A vent of 3.5 kg here brings the room to 9,700 ppm without the fan.")),
        vessel.limits().relief().isPresent() ? whatIfs(bar) : List.of());
  }

  private static List<WhatIf> whatIfs(double bar) {
    TimeRange warming =
        new TimeRange(
            Duration.ofHours(19), Duration.ofHours(15), Optional.of(Duration.ofMinutes(2470)));
    TimeRange filling =
        new TimeRange(
            Duration.ofSeconds(42), Duration.ofSeconds(35), Optional.of(Duration.ofSeconds(50)));
    return List.of(
        new WhatIf(
            WhatIf.Kind.WARM,
            "warmed to 24 °C",
            Optional.of(spread(bar + 0.41)),
            Optional.of(warming),
            "time constant 40 h (33 to 48 h), learnt from its warming from 4 to 9.2 °C on"
                + " 2026-02-27",
            "shut, cooling lost now; at the end at rest with the air about it",
            List.of(new Caution(true, "Keep it cold or let it down first."))),
        new WhatIf(
            WhatIf.Kind.SUPPLY,
            "supply fails open",
            Optional.of(new Estimate.Spread(8 * BAR, 8 * BAR, 8 * BAR)),
            Optional.of(filling),
            "the setting of 1.50 bar g in 55 s",
            "regulator open all the way, nothing lets gas out",
            List.of()),
        new WhatIf(
            WhatIf.Kind.RELIEF,
            "relief valve passes",
            Optional.empty(),
            Optional.empty(),
            "278 kg/h of gas at 1.65 bar g; used by fermentation 1 %, supply 14 %",
            "gas alone: foam and two-phase flow are not covered",
            List.of()),
        new WhatIf(
            WhatIf.Kind.DRAW,
            "drawn off, no gas let in",
            Optional.of(spread(-0.82)),
            Optional.empty(),
            "183 L (161 to 205) already reach the vacuum limit of -0.02 bar g",
            "all of the liquid, so quickly that it gives off no gas meanwhile",
            List.of()));
  }

  private static Estimate.Spread spread(double bar) {
    return new Estimate.Spread((bar - 0.04) * BAR, bar * BAR, (bar + 0.05) * BAR);
  }

  private static Projection projection(Scenario scenario, String words, double bar) {
    return new Projection(
        scenario, words, bar * BAR, (bar - 0.04) * BAR, (bar + 0.05) * BAR, Optional.empty());
  }

  private static List<Rung> ladder(Vessel vessel, double bar, Outlook outlook) {
    List<Rung> rungs = new ArrayList<>();
    Limits limits = vessel.limits();
    limits
        .vesselPaGauge()
        .ifPresent(p -> rungs.add(new Rung(Rung.Kind.VESSEL_LIMIT, p, "vessel limit")));
    limits
        .relief()
        .ifPresent(
            r -> {
              rungs.add(new Rung(Rung.Kind.RELIEF_SET, r.setPaGauge(), "relief set"));
              rungs.add(
                  new Rung(Rung.Kind.EARLIEST_LIFT, r.earliestLiftPaGauge(), "earliest lift"));
            });
    outlook
        .projections()
        .forEach(p -> rungs.add(new Rung(Rung.Kind.FORECAST, p.paGauge(), p.words())));
    rungs.add(new Rung(Rung.Kind.NOW, bar * BAR, "now"));
    rungs.add(new Rung(Rung.Kind.ATMOSPHERE, 0, "atmosphere"));
    limits
        .vacuumPaGauge()
        .ifPresent(p -> rungs.add(new Rung(Rung.Kind.VACUUM_LIMIT, p, "vacuum limit")));
    rungs.sort(Comparator.comparingDouble(Rung::paGauge).reversed());
    return rungs;
  }

  /** Two hours of a slow rise with a vent in it and a little wander. */
  private static History history(double bar, double celsius, Instant now) {
    History history = new History();
    for (int s = 7_200; s >= 1; s -= 2) {
      double shape = s > 5_000 ? 0.15 - s * 1e-5 : -s * 2e-5;
      double wander = 0.002 * Math.sin(s * 0.9) + 0.003 * Math.sin(s / 311.0);
      history.addPressure(now.minusSeconds(s), (bar + shape + wander) * BAR);
      history.addTemperature(
          now.minusSeconds(s), celsius + ZERO_C - s * 1e-4 + 0.1 * Math.sin(s / 700.0));
    }
    return history;
  }
}
