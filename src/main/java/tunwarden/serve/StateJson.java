package tunwarden.serve;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.time.Duration;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.assess.Rung;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.WhatIf;
import tunwarden.units.Constants;
import tunwarden.units.Unit;

/** Every vessel's newest assessment as JSON; units stand in the keys, what is unknown is null. */
final class StateJson {
  private StateJson() {}

  static ObjectNode of(Served served) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("time", served.clock().instant().toString());
    AlarmBook book = served.book().get();
    ArrayNode vessels = node.putArray("vessels");
    for (Assessment assessment : served.state().assessments()) {
      vessels.add(vessel(assessment, book.alarms(assessment.vessel().id())));
    }
    alarms(node.putArray("alarms"), book.alarms(AlarmBook.STATION));
    node.put("alarms_raised", book.counts().raised());
    node.put("alarms_chattered", book.counts().chattered());
    node.put("alarm_floods", book.counts().floods());
    node.put("alarm_flood", book.counts().flood());
    return node;
  }

  private static ObjectNode vessel(Assessment assessment, List<Alarm> alarms) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("vessel", assessment.vessel().id());
    node.put("title", assessment.vessel().title());
    node.put("time", assessment.time().toString());
    Observed pressure = assessment.pressure();
    number(node, "pressure_bar_g", value(pressure, Unit.BAR));
    observed(node, "pressure", pressure);
    number(node, "temperature_c", value(assessment.temperature(), Unit.CELSIUS));
    observed(node, "temperature", assessment.temperature());
    assessment.estimate().ifPresent(estimate -> estimate(node, estimate));
    assessment
        .margins()
        .ifPresent(
            margins -> {
              number(node, "relief_margin_bar", Unit.BAR.fromSi(margins.reliefPa()));
              number(node, "relief_margin_share", margins.shareOfSet());
              number(node, "pressure_u95_bar", Unit.BAR.fromSi(margins.readingU95Pa()));
              number(node, "warming_to_lift_k", orNaN(margins.warmingK()));
            });
    outlook(node, assessment.outlook());
    ArrayNode ladder = node.putArray("ladder");
    for (Rung rung : assessment.ladder()) {
      ObjectNode step = ladder.addObject();
      step.put("kind", rung.kind().name().toLowerCase(Locale.ROOT).replace('_', '-'));
      number(step, "bar_g", Unit.BAR.fromSi(rung.paGauge()));
      step.put("label", rung.label());
    }
    assessment.notes().forEach(node.putArray("notes")::add);
    alarms(node.putArray("alarms"), alarms);
    return node;
  }

  private static void observed(ObjectNode node, String name, Observed observed) {
    node.put(name + "_quality", observed.quality().level().name().toLowerCase(Locale.ROOT));
    node.put(name + "_quality_reason", observed.quality().why());
    if (observed.at().isPresent()) {
      node.put(name + "_time", observed.at().get().toString());
      number(node, name + "_age_s", observed.age().toMillis() / 1000.0);
    }
  }

  private static void estimate(ObjectNode node, Estimate estimate) {
    number(node, "dissolved_g_per_l", estimate.dissolvedKgPerM3());
    number(node, "dissolved_u95_g_per_l", estimate.dissolvedU95KgPerM3());
    number(node, "dissolved_volumes", estimate.dissolvedKgPerM3() / Constants.CO2_VOLUME_KG_PER_M3);
    number(node, "equilibrium_g_per_l", estimate.equilibriumKgPerM3());
    number(node, "settled", estimate.settled());
    number(node, "air_fraction", estimate.airFraction());
    node.put("mode", estimate.mode().word());
    number(node, "mode_confidence", estimate.modeConfidence());
    node.put("ignorance", estimate.ignorance());
  }

  private static void outlook(ObjectNode node, Outlook outlook) {
    outlook.timeToLift().ifPresent(range -> time(node.putObject("time_to_lift"), range));
    outlook
        .soonestToLift()
        .ifPresent(soonest -> node.put("soonest_to_lift_s", soonest.toSeconds()));
    number(node, "horizon_s", outlook.horizon().toSeconds());
    number(node, "lift_temperature_c", celsius(outlook.liftTemperatureK()));
    number(node, "liquid_full_c", celsius(outlook.liquidFullK()));
    ArrayNode cautions = node.putArray("cautions");
    outlook.cautions().forEach(caution -> cautions.add(caution.text()));
    ArrayNode whatIfs = node.putArray("what_if");
    outlook.whatIfs().forEach(each -> whatIf(whatIfs.addObject(), each));
  }

  private static void whatIf(ObjectNode node, WhatIf each) {
    node.put("kind", each.kind().word());
    node.put("words", each.words());
    each.paGauge()
        .ifPresent(
            pa -> {
              number(node, "bar_g", Unit.BAR.fromSi(pa.middle()));
              number(node, "low_bar_g", Unit.BAR.fromSi(pa.low()));
              number(node, "high_bar_g", Unit.BAR.fromSi(pa.high()));
            });
    each.toLift().ifPresent(range -> time(node.putObject("time_to_lift"), range));
    node.put("detail", each.detail());
    node.put("assumes", each.assumes());
    ArrayNode cautions = node.putArray("cautions");
    each.cautions().forEach(caution -> cautions.add(caution.text()));
  }

  private static void time(ObjectNode node, TimeRange range) {
    node.put("middle_s", range.middle().toSeconds());
    node.put("low_s", range.low().toSeconds());
    range.high().map(Duration::toSeconds).ifPresent(high -> node.put("high_s", high));
  }

  static void alarms(ArrayNode array, List<Alarm> alarms) {
    for (Alarm alarm : alarms) {
      ObjectNode node = array.addObject();
      node.put("alarm", alarm.kind().id());
      node.put("priority", alarm.priority().word());
      node.put("state", alarm.state().id());
      node.put("since", alarm.since().toString());
      node.put("changed", alarm.changed().toString());
      alarm.shelvedUntil().ifPresent(until -> node.put("shelved_until", until.toString()));
      node.put("text", alarm.text());
      node.put("action", alarm.action());
      node.put("remark", alarm.remark());
    }
  }

  private static double value(Observed observed, Unit unit) {
    return observed.value().isPresent() ? unit.fromSi(observed.value().getAsDouble()) : Double.NaN;
  }

  private static double celsius(OptionalDouble kelvin) {
    return kelvin.isPresent() ? Unit.CELSIUS.fromSi(kelvin.getAsDouble()) : Double.NaN;
  }

  private static double orNaN(OptionalDouble value) {
    return value.orElse(Double.NaN);
  }

  private static void number(ObjectNode node, String name, double value) {
    if (Double.isFinite(value)) {
      // Twelve digits: enough for any figure here, and no tail of binary digits.
      node.put(name, new BigDecimal(value, new MathContext(12)).doubleValue());
    } else {
      node.putNull(name);
    }
  }
}
