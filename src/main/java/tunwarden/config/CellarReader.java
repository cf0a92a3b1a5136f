package tunwarden.config;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.RecorderSettings;
import tunwarden.reading.Quantity;
import tunwarden.units.Display;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/** The whole file, table by table. */
final class CellarReader {
  /** What is safe as the name of a file and a folder everywhere. */
  private static final Pattern NAME = Pattern.compile("[A-Za-z0-9][A-Za-z0-9_-]{0,31}");

  private static final Pattern RESERVED = Pattern.compile("(?i)con|prn|aux|nul|com[0-9]|lpt[0-9]");

  private final Section root;
  private final Problems problems;
  private final List<Vessel> vessels = new ArrayList<>();
  private final List<Instrument> instruments = new ArrayList<>();

  CellarReader(Section root, Problems problems) {
    this.root = root;
    this.problems = problems;
  }

  Cellar read(Path file) {
    Section siteSection = root.section("site");
    Site site = SiteReader.read(siteSection);
    vessels(site);
    barometer(siteSection);
    siteSection.close();
    Display display = AlarmsReader.display(root.section("display"));
    AlarmSettings alarms = AlarmsReader.read(root.section("alarms"), display);
    RecorderSettings recording = RecordingReader.read(root.section("recording"));
    NoticePlan notice = NoticeReader.read(root.section("notice"));
    root.close();
    return new Cellar(file, site, vessels, instruments, alarms, recording, notice);
  }

  private void vessels(Site site) {
    Section all = root.section("vessel");
    if (all.names().isEmpty()) {
      problems.add(List.of(), "there is no vessel; add a table such as [vessel.FV1]");
    }
    Map<String, String> seen = new HashMap<>();
    for (String id : all.names()) {
      String twin = seen.putIfAbsent(id.toLowerCase(Locale.ROOT), id);
      if (twin != null) {
        all.problem(id, "this name differs from '" + twin + "' only in capitals; choose another");
      }
      if (!NAME.matcher(id).matches() || RESERVED.matcher(id).matches()) {
        all.problem(
            id,
            "a vessel's name is also a file name: write up to 32 letters, digits, '-' and '_', and"
                + " no device name");
      }
      vessel(all.section(id), id, site);
    }
  }

  private void vessel(Section section, String id, Site site) {
    int before = problems.count();
    List<Instrument> readings = ReadingsReader.read(section, id);
    Vessel vessel = new VesselReader(section, site).read(id, readings);
    section.close();
    if (problems.count() == before) {
      vessels.add(vessel);
      instruments.addAll(readings);
    }
  }

  /** A barometer belongs to the site and so to every vessel. */
  private void barometer(Section site) {
    if (!site.has("barometer")) {
      return;
    }
    Instrument one =
        ReadingsReader.instrument(site.section("barometer"), "", Quantity.BAROMETER, false);
    for (Vessel vessel : vessels) {
      instruments.add(one.forVessel(vessel.id()));
    }
  }
}
