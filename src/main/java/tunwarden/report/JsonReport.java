package tunwarden.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.replay.LogWriter;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Extremes;
import tunwarden.report.story.Chapter;
import tunwarden.report.story.Hypothesis;
import tunwarden.report.story.Story;
import tunwarden.units.Unit;

/** The report as one JSON object; keys end in their unit, what is not known is null. */
final class JsonReport {
  private static final ObjectMapper MAPPER =
      new ObjectMapper().enable(SerializationFeature.INDENT_OUTPUT);

  private JsonReport() {}

  /** The text, ending in a line feed. */
  static String text(List<Chapter> chapters) {
    try {
      if (chapters.size() == 1) {
        return MAPPER.writeValueAsString(object(chapters.get(0))) + "\n";
      }
      ObjectNode root = MAPPER.createObjectNode();
      ArrayNode compared = root.putArray("compared");
      chapters.forEach(chapter -> compared.add(object(chapter)));
      return MAPPER.writeValueAsString(root) + "\n";
    } catch (JsonProcessingException impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  private static ObjectNode object(Chapter chapter) {
    Analysis analysis = chapter.analysis();
    Extremes extremes = analysis.extremes();
    ObjectNode root = MAPPER.createObjectNode();
    root.put("vessel", analysis.vessel().id());
    root.put("rows", analysis.rows());
    root.put("from", LogWriter.timeText(extremes.from()));
    root.put("to", LogWriter.timeText(extremes.until()));
    number(root, "peak_pressure_bar_g", Unit.BAR.fromSi(extremes.peak().paGauge()), 4);
    root.put("peak_time", LogWriter.timeText(extremes.peak().time()));
    number(
        root,
        "least_relief_margin_bar",
        extremes.closest() == null ? Double.NaN : Unit.BAR.fromSi(extremes.closest().marginPa()),
        4);
    number(root, "gas_lost_g", 1000 * analysis.gasLostKg(), 1);
    ArrayNode events = root.putArray("events");
    analysis.events().forEach(event -> events.add(event(event)));
    Story story = chapter.story();
    story.summary().forEach(root.putArray("summary")::add);
    ArrayNode hypotheses = root.putArray("hypotheses");
    story.hypotheses().forEach(hypothesis -> hypotheses.add(hypothesis(hypothesis)));
    story.sensors().forEach(root.putArray("sensors")::add);
    story.outlook().forEach(root.putArray("what_next")::add);
    story.unknowns().forEach(root.putArray("assumptions")::add);
    story.cautions().forEach(root.putArray("cautions")::add);
    chapter.notes().forEach(root.putArray("import_notes")::add);
    ArrayNode inputs = root.putArray("inputs");
    for (Chapter.Input input : chapter.inputs()) {
      inputs.addObject().put("file", input.name()).put("sha256", input.sha256());
    }
    return root;
  }

  private static ObjectNode event(Event event) {
    ObjectNode node = MAPPER.createObjectNode();
    node.put("time", LogWriter.timeText(event.time()));
    node.put("kind", event.kind().word());
    node.put("until", LogWriter.timeText(event.until()));
    number(node, "from_bar_g", Unit.BAR.fromSi(event.fromPaGauge()), 4);
    number(node, "to_bar_g", Unit.BAR.fromSi(event.toPaGauge()), 4);
    number(node, "gas_g", 1000 * event.gasKg(), 1);
    number(node, "confidence", event.confidence(), 2);
    node.put("why", event.why());
    return node;
  }

  private static ObjectNode hypothesis(Hypothesis hypothesis) {
    ObjectNode node = MAPPER.createObjectNode();
    node.put("cause", hypothesis.cause());
    node.put("standing", hypothesis.standing());
    hypothesis.evidenceFor().forEach(node.putArray("for")::add);
    hypothesis.evidenceAgainst().forEach(node.putArray("against")::add);
    return node;
  }

  private static void number(ObjectNode node, String key, double value, int decimals) {
    if (!Double.isFinite(value)) {
      node.putNull(key);
      return;
    }
    BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN);
    node.put(key, rounded.signum() == 0 ? BigDecimal.ZERO : rounded.stripTrailingZeros());
  }
}
