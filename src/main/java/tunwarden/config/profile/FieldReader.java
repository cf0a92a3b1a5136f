package tunwarden.config.profile;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.units.Unit;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.Place;
import tunwarden.wire.profile.RawType;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.profile.WordOrder;
import tunwarden.wire.signal.Conversion;
import tunwarden.wire.signal.CurrentLoop;
import tunwarden.wire.signal.Linear;
import tunwarden.wire.signal.ResistanceThermometer;

/** Reads one field of a device profile. */
final class FieldReader {
  private static final Map<String, Kind> MEASURES =
      Map.of(
          "pressure", Kind.PRESSURE,
          "temperature", Kind.TEMPERATURE,
          "level", Kind.VOLUME,
          "gravity", Kind.EXTRACT,
          "dissolved", Kind.GAS_CONTENT);

  private final JsonAt at;
  private final Speaks speaks;
  private final Framing framing;

  FieldReader(JsonAt at, Speaks speaks, Framing framing) {
    this.at = at;
    this.speaks = speaks;
    this.framing = framing;
  }

  Field read(String name) {
    at.allow(
        "measures",
        "key",
        "column",
        "register",
        "send",
        "unit",
        "suffix",
        "scale",
        "offset",
        "fault-words",
        "fault-numbers",
        "current-loop",
        "resistance-thermometer",
        "range",
        "accuracy",
        "response");
    Kind kind = at.choice("measures", MEASURES, null);
    Pressure.Reference reference = reference(kind);
    Conversion conversion = conversion(kind, reference);
    Field.Trust trust = trust(kind, reference, conversion);
    return new Field(name, kind, reference, place(), number(), conversion, trust);
  }

  private Place place() {
    if (speaks == Speaks.MODBUS_RTU) {
      return register(at.object("register"));
    }
    if (at.has("register")) {
      throw at.bad("register", "is for modbus-rtu only; use key or column");
    }
    if (framing.layout() == Framing.Layout.PAIRS) {
      return new Place.Key(at.text("key"));
    }
    if (!at.has("column")) {
      throw at.bad("column", "is missing; the framing says that values stand in columns");
    }
    return new Place.Column(at.whole("column", 1, 200, 1));
  }

  private static Place register(JsonAt at) {
    at.allow("function", "address", "type", "words");
    int function = at.whole("function", 1, 4, 3);
    String usual = function <= 2 ? RawType.BIT.word() : RawType.UINT16.word();
    RawType type = at.choice("type", ProfileReader.table(RawType.values(), RawType::word), usual);
    if ((function <= 2) != (type == RawType.BIT)) {
      throw at.bad("type", "must be bit for functions 1 and 2, and a number for 3 and 4");
    }
    int address = at.whole("address", 0, 0x10000 - type.registers(), -1);
    return new Place.Register(
        function,
        address,
        type,
        at.choice("words", ProfileReader.table(WordOrder.values(), WordOrder::word), "high-first"));
  }

  private Field.Number number() {
    if (speaks == Speaks.TEXT_QUERY != at.has("send")) {
      throw at.bad("send", at.has("send") ? "is for text-query only" : "is missing");
    }
    double scale = at.number("scale", 1);
    if (scale == 0) {
      throw at.bad("scale", "must not be 0");
    }
    List<String> words = new ArrayList<>();
    for (JsonNode word : at.list("fault-words")) {
      words.add(word.asText());
    }
    List<Double> numbers = new ArrayList<>();
    for (JsonNode number : at.list("fault-numbers")) {
      if (!number.isNumber()) {
        throw at.bad("fault-numbers", "must hold numbers only");
      }
      numbers.add(number.doubleValue());
    }
    return new Field.Number(
        at.text("send", ""),
        at.text("suffix", ""),
        scale,
        at.number("offset", 0),
        List.copyOf(words),
        List.copyOf(numbers));
  }

  /** From the unit: {@code bara} is absolute, {@code bar} and {@code barg} are gauge. */
  private Pressure.Reference reference(Kind kind) {
    boolean direct = !at.has("current-loop") && kind == Kind.PRESSURE;
    if (!direct) {
      return at.has("current-loop") && kind == Kind.PRESSURE
          ? pressure("at-4-mA", at.object("current-loop").text("at-4-mA")).reference()
          : Pressure.Reference.GAUGE;
    }
    return pressure("unit", "1 " + at.text("unit")).reference();
  }

  private Pressure pressure(String key, String text) {
    try {
      return Pressure.parse(text);
    } catch (BadQuantityException e) {
      throw at.bad(key, "is wrong: " + e.getMessage());
    }
  }

  private Conversion conversion(Kind kind, Pressure.Reference reference) {
    if (at.has("current-loop")) {
      requireUnit(Kind.CURRENT, Unit.MILLIAMPERE);
      JsonAt loop = at.object("current-loop");
      loop.allow("at-4-mA", "at-20-mA");
      double low = loop.quantity("at-4-mA", loop.text("at-4-mA"), kind, reference);
      double high = loop.quantity("at-20-mA", loop.text("at-20-mA"), kind, reference);
      if (low == high) {
        throw loop.bad("at-20-mA", "must differ from at-4-mA");
      }
      return new CurrentLoop(low, high);
    }
    if (at.has("resistance-thermometer")) {
      requireUnit(Kind.RESISTANCE, Unit.OHM);
      JsonAt element = at.object("resistance-thermometer");
      element.allow("zero");
      double zero = element.quantity("zero", element.text("zero", "100 ohm"), Kind.RESISTANCE);
      if (kind != Kind.TEMPERATURE || zero < 1) {
        throw at.bad("resistance-thermometer", "needs a temperature and a resistance over 1 ohm");
      }
      return new ResistanceThermometer(zero);
    }
    return new Linear(unit(kind));
  }

  private void requireUnit(Kind kind, Unit unit) {
    if (Quantities.unitOf(at.text("unit"), kind).orElse(null) != unit) {
      throw at.bad("unit", "must be " + unit.symbol() + " here; use scale to get there");
    }
  }

  private Unit unit(Kind kind) {
    String symbol = at.text("unit");
    Optional<Unit> unit = Quantities.unitOf(symbol, kind);
    if (unit.isEmpty() && kind == Kind.PRESSURE) {
      unit = Quantities.unitOf(symbol.substring(0, Math.max(0, symbol.length() - 1)), kind);
    }
    return unit.orElseThrow(
        () -> at.bad("unit", "is '" + symbol + "'; use one of " + kind.symbols()));
  }

  private Field.Trust trust(Kind kind, Pressure.Reference reference, Conversion conversion) {
    double low = Double.NEGATIVE_INFINITY;
    double high = Double.POSITIVE_INFINITY;
    if (at.has("range")) {
      List<JsonNode> ends = at.list("range");
      if (ends.size() != 2) {
        throw at.bad("range", "must hold two values, lowest and highest");
      }
      low = at.quantity("range", ends.get(0).asText(), kind, reference);
      high = at.quantity("range", ends.get(1).asText(), kind, reference);
    } else if (conversion instanceof CurrentLoop loop) {
      low = Math.min(loop.toSi(CurrentLoop.LEAST_MA).si(), loop.toSi(CurrentLoop.MOST_MA).si());
      high = Math.max(loop.toSi(CurrentLoop.LEAST_MA).si(), loop.toSi(CurrentLoop.MOST_MA).si());
    } else {
      throw at.bad("range", "is missing; say what the instrument can measure, lowest and highest");
    }
    if (!(low < high)) {
      throw at.bad("range", "must rise");
    }
    return new Field.Trust(low, high, accuracy(kind), at.durationS("response", "0 s"));
  }

  /** An accuracy is a difference: no zero of the temperature scale is applied. */
  private double accuracy(Kind kind) {
    String text = at.text("accuracy");
    double si =
        switch (kind) {
          case PRESSURE -> pressure("accuracy", text).pa();
          case TEMPERATURE -> at.quantity("accuracy", text, Kind.TEMPERATURE_DIFFERENCE);
          default -> at.quantity("accuracy", text, kind);
        };
    if (!(si > 0)) {
      throw at.bad("accuracy", "must be above zero");
    }
    return si;
  }
}
