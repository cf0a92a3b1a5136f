package tunwarden.replay;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;

/**
 * One short log written in many ways; each says the same three rows (invented values):
 * 2026-03-02T08:00:00Z, 08:00:30Z and 08:01:00Z, pressures 0.873, 0.875 and 0.880 bar gauge at
 * 5.25, 5.30 and 5.40 °C.
 */
final class ForeignSamples {
  /**
   * One way to write it.
   *
   * @param name what is particular
   * @param bytes the file
   * @param options what has to be stated
   * @param said a piece of what the import must say; empty when nothing needs saying
   */
  record Case(String name, byte[] bytes, LogOptions options, String said) {
    @Override
    public String toString() {
      return name;
    }
  }

  private static final LogOptions NONE = LogOptions.NONE;
  private static final LogOptions VIENNA = NONE.inZone(ZoneId.of("Europe/Vienna"));

  private final List<Case> cases = new ArrayList<>();

  private ForeignSamples() {}

  static List<Case> all() {
    ForeignSamples samples = new ForeignSamples();
    samples.separatorsAndSigns();
    samples.units();
    samples.times();
    samples.moreTimes();
    samples.shapes();
    samples.encodings();
    return samples.cases;
  }

  private void add(String name, String said, LogOptions options, String... lines) {
    byte[] bytes = (String.join("\n", lines) + "\n").getBytes(StandardCharsets.UTF_8);
    cases.add(new Case(name, bytes, options, said));
  }

  private void separatorsAndSigns() {
    add(
        "semicolons and decimal commas",
        "decimal commas",
        VIENNA,
        "Zeit;Druck [bar];Temperatur [°C]",
        "02.03.2026 09:00:00;0,873;5,25",
        "02.03.2026 09:00:30;0,875;5,30",
        "02.03.2026 09:01:00;0,880;5,40");
    add(
        "tabs",
        "tabs",
        NONE,
        "Timestamp\tPressure (bar)\tTemp (C)",
        "2026-03-02 08:00:00\t0.873\t5.25",
        "2026-03-02 08:00:30\t0.875\t5.30",
        "2026-03-02 08:01:00\t0.880\t5.40");
    add(
        "bars between fields",
        "bars",
        NONE,
        "when | tank pressure barg | tank temp degC",
        "2026-03-02T08:00:00Z | 0.873 | 5.25",
        "2026-03-02T08:00:30Z | 0.875 | 5.30",
        "2026-03-02T08:01:00Z | 0.880 | 5.40");
    add(
        "quoted decimal commas between commas",
        "decimal commas",
        NONE,
        "\"Date/Time\",\"Pressure, bar\",\"Temperature, °C\"",
        "\"2026-03-02 08:00:00\",\"0,873\",\"5,25\"",
        "\"2026-03-02 08:00:30\",\"0,875\",\"5,30\"",
        "\"2026-03-02 08:01:00\",\"0,880\",\"5,40\"");
    add(
        "mbar with grouped thousands and a sign",
        "semicolons",
        NONE,
        "time;P [mbar] abs;T [K]",
        "2026-03-02T08:00:00Z;1.886,25;278,40",
        "2026-03-02T08:00:30Z;1.888,25;278,45",
        "2026-03-02T08:01:00Z;1.893,25;278,55");
  }

  private void units() {
    add(
        "psi and Fahrenheit",
        "gauge",
        NONE,
        "time,P [psi],Temp (°F)",
        "2026-03-02T08:00:00Z,12.66179,41.45",
        "2026-03-02T08:00:30Z,12.6908,41.54",
        "2026-03-02T08:01:00Z,12.76332,41.72");
    add(
        "kPa gauge in the name",
        "UTC",
        NONE,
        "Date Time,Headspace pressure kPag,Liquid temperature C",
        "2026/03/02 08:00:00,87.3,5.25",
        "2026/03/02 08:00:30,87.5,5.30",
        "2026/03/02 08:01:00,88.0,5.40");
    add(
        "absolute kPa",
        "absolute",
        NONE,
        "time,Pressure [kPa abs],T [°C]",
        "2026-03-02T08:00:00Z,188.625,5.25",
        "2026-03-02T08:00:30Z,188.825,5.30",
        "2026-03-02T08:01:00Z,189.325,5.40");
    add(
        "absolute with a barometer beside it",
        "absolute",
        NONE,
        "time,bara,barometer [hPa],temp C",
        "2026-03-02T08:00:00Z,1.853,980,5.25",
        "2026-03-02T08:00:30Z,1.855,980,5.30",
        "2026-03-02T08:01:00Z,1.860,980,5.40");
    add(
        "unit in every cell",
        "gauge",
        NONE,
        "time,pressure,temperature",
        "2026-03-02T08:00:00Z,873 mbar,5.25 °C",
        "2026-03-02T08:00:30Z,875 mbar,5.30 °C",
        "2026-03-02T08:01:00Z,880 mbar,5.40 °C");
    add(
        "no unit anywhere",
        "by its size",
        NONE,
        "time,press,temp",
        "2026-03-02T08:00:00Z,0.873,5.25",
        "2026-03-02T08:00:30Z,0.875,5.30",
        "2026-03-02T08:01:00Z,0.880,5.40");
    add(
        "units in a second line",
        "gauge",
        NONE,
        "Stamp,PT-101,TT-101",
        ",kPa,°C",
        "2026-03-02 08:00:00,87.3,5.25",
        "2026-03-02 08:00:30,87.5,5.30",
        "2026-03-02 08:01:00,88.0,5.40");
    add(
        "MPa with an exponent",
        "gauge",
        NONE,
        "time,p/MPa,t/°C",
        "2026-03-02T08:00:00Z,8.73e-2,5.25E+0",
        "2026-03-02T08:00:30Z,8.75e-2,5.30E+0",
        "2026-03-02T08:01:00Z,8.80e-2,5.40E+0");
  }

  private void times() {
    add(
        "epoch seconds",
        "seconds since 1970",
        NONE,
        "epoch,pressure_bar,temp_c",
        "1772438400,0.873,5.25",
        "1772438430,0.875,5.30",
        "1772438460,0.880,5.40");
    add(
        "epoch milliseconds",
        "milliseconds since 1970",
        NONE,
        "ts,pressure_bar,temp_c",
        "1772438400000,0.873,5.25",
        "1772438430000,0.875,5.30",
        "1772438460000,0.880,5.40");
    add(
        "epoch seconds with decimals",
        "seconds since 1970",
        NONE,
        "unix time,P bar,T C",
        "1772438400.000,0.873,5.25",
        "1772438430.000,0.875,5.30",
        "1772438460.000,0.880,5.40");
    add(
        "month first with AM and PM",
        "month first",
        NONE.withColumns("time=Date/mdy"),
        "Date,Pressure [bar],Temp [C]",
        "3/2/2026 8:00:00 AM,0.873,5.25",
        "3/2/2026 8:00:30 AM,0.875,5.30",
        "3/2/2026 8:01:00 AM,0.880,5.40");
    add(
        "day first with slashes and two-digit years",
        "day, month, year",
        NONE,
        "Date;Pression (bar);Température (°C)",
        "02/03/26 08:00:00;0,873;5,25",
        "02/03/26 08:00:30;0,875;5,30",
        "02/03/26 08:01:00;0,880;5,40");
  }

  private void moreTimes() {
    add(
        "date and time of day apart",
        "together make the time",
        NONE,
        "Date,Time,P (bar),T (C)",
        "2026-03-02,08:00:00,0.873,5.25",
        "2026-03-02,08:00:30,0.875,5.30",
        "2026-03-02,08:01:00,0.880,5.40");
    add(
        "month as a word",
        "UTC",
        NONE,
        "Recorded,P (bar),T (C)",
        "02-Mar-2026 08:00:00,0.873,5.25",
        "02-Mar-2026 08:00:30,0.875,5.30",
        "02-Mar-2026 08:01:00,0.880,5.40");
    add(
        "offset with a colon and fractions",
        "gauge",
        NONE,
        "time,P (bar),T (C)",
        "2026-03-02T09:00:00.000+01:00,0.873,5.25",
        "2026-03-02T09:00:30.000+01:00,0.875,5.30",
        "2026-03-02T09:01:00.000+01:00,0.880,5.40");
    add(
        "offset without a colon",
        "gauge",
        NONE,
        "time,P (bar),T (C)",
        "2026-03-02 03:00:00 -0500,0.873,5.25",
        "2026-03-02 03:00:30 -0500,0.875,5.30",
        "2026-03-02 03:01:00 -0500,0.880,5.40");
    add(
        "basic ISO form",
        "gauge",
        NONE,
        "time,P (bar),T (C)",
        "20260302T080000Z,0.873,5.25",
        "20260302T080030Z,0.875,5.30",
        "20260302T080100Z,0.880,5.40");
    add(
        "spreadsheet days",
        "gauge",
        NONE.withColumns("time=day/days"),
        "day,P (bar),T (C)",
        "46083.3333333333,0.873,5.25",
        "46083.3336805556,0.875,5.30",
        "46083.3340277778,0.880,5.40");
  }

  private void shapes() {
    add(
        "a preamble above the names",
        "gauge",
        NONE,
        "Export of recorder 7",
        "Station: north cellar; Interval 30 s",
        "",
        "Time,Pressure [bar],Temp [°C]",
        "2026-03-02 08:00:00,0.873,5.25",
        "2026-03-02 08:00:30,0.875,5.30",
        "2026-03-02 08:01:00,0.880,5.40");
    add(
        "names in a comment",
        "gauge",
        NONE,
        "# made by a small script",
        "# time,pressure_bar,temp_c",
        "2026-03-02T08:00:00Z,0.873,5.25",
        "2026-03-02T08:00:30Z,0.875,5.30",
        "2026-03-02T08:01:00Z,0.880,5.40");
    add(
        "no names at all",
        "by number",
        NONE.withColumns("time=1,pressure=3/barg,temperature=2/C"),
        "2026-03-02T08:00:00Z,5.25,0.873",
        "2026-03-02T08:00:30Z,5.30,0.875",
        "2026-03-02T08:01:00Z,5.40,0.880");
    add(
        "columns stated in an unknown language",
        "UTC",
        NONE.withColumns("time=aika,pressure=paine/mbar,temperature=lämpö/C"),
        "aika;paine;lämpö",
        "2026-03-02 08:00:00;873;5.25",
        "2026-03-02 08:00:30;875;5.30",
        "2026-03-02 08:01:00;880;5.40");
    add(
        "extra columns, blanks and an empty field at the end",
        "not used",
        NONE,
        "No.,time,jacket temp [°C],P [bar],T [°C],battery [V],",
        "1,2026-03-02T08:00:00Z,-1.0,0.873,5.25,3.1,",
        "2,2026-03-02T08:00:30Z,-1.0,0.875,5.30,3.1,",
        "",
        "3,2026-03-02T08:01:00Z,-1.0,0.880,5.40,3.1,");
    add(
        "rows out of order and repeated",
        "order of their times",
        NONE,
        "time,P [bar],T [°C]",
        "2026-03-02T08:00:30Z,0.875,5.30",
        "2026-03-02T08:00:00Z,0.873,5.25",
        "2026-03-02T08:01:00Z,0.880,5.40",
        "2026-03-02T08:01:00Z,0.880,5.40");
  }

  private void encodings() {
    String german =
        "Zeit;Überdruck [bar];Temp. [°C]\r\n"
            + "02.03.2026 08:00:00;0,873;5,25\r\n"
            + "02.03.2026 08:00:30;0,875;5,30\r\n"
            + "02.03.2026 08:01:00;0,880;5,40\r\n";
    cases.add(
        new Case(
            "byte-order mark", ("\ufeff" + german).getBytes(StandardCharsets.UTF_8), NONE, "UTC"));
    cases.add(
        new Case(
            "Windows-1252 and CR LF",
            german.getBytes(Charset.forName("windows-1252")),
            NONE,
            "Windows-1252"));
    cases.add(
        new Case(
            "UTF-16 with its mark",
            ("\ufeff" + german).getBytes(StandardCharsets.UTF_16LE),
            NONE,
            "UTF-16"));
  }
}
