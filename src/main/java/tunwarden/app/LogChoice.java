package tunwarden.app;

import java.io.IOException;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import picocli.CommandLine.Option;
import tunwarden.alarm.AlarmSettings;
import tunwarden.app.options.VesselOptions;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogReader;
import tunwarden.replay.LogRow;
import tunwarden.report.Reporter;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Vessel;

/** Which vessel a log is about, and how a foreign log is to be read. */
final class LogChoice {
  private static final int ROWS_LOOKED_AT = 2000;

  @Option(
      names = "--cellar",
      paramLabel = "FILE",
      description = "Cellar file with the vessel; else describe it by the options below.")
  private Path cellar;

  @Option(
      names = "--vessel",
      paramLabel = "ID",
      description = "Which vessel, if there are several.")
  private List<String> ids = new ArrayList<>();

  @Option(
      names = "--zone",
      paramLabel = "ZONE",
      description = "Zone of times written without an offset, as Europe/Vienna or +01:00.")
  private String zone;

  @Option(
      names = "--columns",
      paramLabel = "COLUMNS",
      description = "Which column is what, as time=Zeit,pressure=Druck/mbar,temperature=T/C.")
  private String columns = "";

  private Progress progress;

  Optional<ZoneId> zone() {
    return Optional.ofNullable(zone).map(ReportCommand::zone);
  }

  void reportBytesTo(Progress watcher) {
    progress = watcher;
  }

  long bytes(Reporter.Source source) throws IOException {
    long bytes = 0;
    for (LogFile log : source.logs()) {
      bytes += log.size();
    }
    return bytes;
  }

  /** One source, or with {@code compare} one for each log or vessel. */
  List<Reporter.Source> sources(List<Path> logs, VesselOptions described, boolean compare)
      throws IOException {
    List<Reporter.Source> sources = new ArrayList<>();
    if (!compare) {
      String id = ids.isEmpty() ? onlyVessel(logs, described) : ids.get(0);
      sources.add(source(id, id, logs, described));
      return sources;
    }
    if (logs.size() > 1) {
      for (Path log : logs) {
        String id = ids.isEmpty() ? onlyVessel(List.of(log), described) : ids.get(0);
        sources.add(source(log.getFileName() + " " + id, id, List.of(log), described));
      }
    } else {
      for (String id : ids) {
        sources.add(source(id, id, logs, described));
      }
    }
    if (sources.size() < 2) {
      throw new BadInputException("--compare: name two logs, or two vessels with --vessel");
    }
    return sources;
  }

  /** The vessels whose logs lie in a folder; what is wrong with one shows when it is read. */
  List<Fleet.Member> members(Path folder, VesselOptions described) throws IOException {
    List<Fleet.Member> members = new ArrayList<>();
    for (FleetFolder.Bundle bundle : FleetFolder.bundles(folder)) {
      Set<String> named;
      try {
        named = named(LogFile.open(bundle.logs().get(0), options()));
      } catch (BadInputException bad) {
        named = Set.of(LogOptions.UNNAMED);
      }
      for (String written : named) {
        String id = written.equals(LogOptions.UNNAMED) ? bundle.name() : written;
        if (ids.isEmpty() || ids.contains(id)) {
          members.add(
              new Fleet.Member(
                  named.size() > 1 && !bundle.name().equals(id) ? bundle.name() + "-" + id : id,
                  () -> source(id, id, bundle.logs(), described)));
        }
      }
    }
    return members;
  }

  private Reporter.Source source(String title, String id, List<Path> logs, VesselOptions described)
      throws IOException {
    Vessel vessel = vessel(id, described);
    List<LogFile> files = new ArrayList<>();
    for (Path log : logs) {
      LogOptions options = options().forVessel(id).withAmbient(vessel.site().ambientPaAbsolute());
      files.add(LogFile.open(log, options).reportingTo(this::bytesRead));
    }
    return new Reporter.Source(title, vessel, files);
  }

  private void bytesRead(long bytes) {
    if (progress != null) {
      progress.bytes(bytes);
    }
  }

  private LogOptions options() {
    LogOptions options = LogOptions.NONE.withColumns(columns);
    return zone().map(options::inZone).orElse(options);
  }

  private Vessel vessel(String id, VesselOptions described) throws IOException {
    if (cellar == null) {
      return described.vessel(id);
    }
    if (described.areGiven()) {
      throw new BadInputException("--cellar: describe the vessel in the file or here, not both");
    }
    Cellar read = CellarFile.read(cellar);
    return read.vessel(id)
        .orElseThrow(
            () ->
                new BadInputException(
                    cellar
                        + ": there is no vessel '"
                        + id
                        + "'; name one with --vessel, it knows "
                        + String.join(", ", read.vessels().stream().map(Vessel::id).toList())));
  }

  /** The vessel the log names; with none named, the only one of the cellar. */
  private String onlyVessel(List<Path> logs, VesselOptions described) throws IOException {
    Set<String> named = new LinkedHashSet<>();
    for (Path log : logs) {
      named.addAll(named(LogFile.open(log, options())));
    }
    if (named.size() > 1) {
      throw new BadInputException(
          logs.get(0)
              + " speaks of several vessels; choose with --vessel one of "
              + String.join(", ", named));
    }
    String only = named.iterator().next();
    if (only.equals(LogOptions.UNNAMED) && cellar != null) {
      List<Vessel> vessels = CellarFile.read(cellar).vessels();
      if (vessels.size() > 1) {
        throw new BadInputException(
            logs.get(0)
                + " names no vessel and "
                + cellar
                + " has several; choose with --vessel one of "
                + String.join(", ", vessels.stream().map(Vessel::id).toList()));
      }
      return vessels.get(0).id();
    }
    return only;
  }

  /** The vessels that the first rows name. */
  private static Set<String> named(LogFile log) throws IOException {
    Set<String> named = new LinkedHashSet<>();
    try (LogReader reader = log.open()) {
      LogRow row = reader.next();
      for (int i = 0; row != null && i < ROWS_LOOKED_AT; i++) {
        named.add(row.vessel());
        row = reader.next();
      }
    }
    return named;
  }

  /**
   * A log to be played with every vessel in it that is described and wanted.
   *
   * @param log how it is read
   * @param vessels at least one
   * @param alarms alarm settings of the cellar file, or the usual ones
   */
  record Played(LogFile log, List<Vessel> vessels, AlarmSettings alarms) {}

  /** The log as it is to be played; volume and fill may be left out. */
  Played played(Path log, VesselOptions described) throws IOException {
    Optional<Cellar> read =
        cellar == null ? Optional.empty() : Optional.of(CellarFile.read(cellar));
    double ambientPa =
        read.map(Cellar::site)
            .orElseGet(() -> described.vesselOfAnySize(LogOptions.UNNAMED).site())
            .ambientPaAbsolute();
    LogOptions options = options().withAmbient(ambientPa);
    Optional<String> stated = ids.isEmpty() ? onlyOf(read) : Optional.of(ids.get(0));
    LogFile file = LogFile.open(log, stated.map(options::forVessel).orElse(options));
    Set<String> named = named(file);
    List<Vessel> vessels = new ArrayList<>();
    for (String id : named) {
      if (!ids.isEmpty() && !ids.contains(id)) {
        continue;
      }
      if (read.isPresent()) {
        read.get().vessel(id).ifPresent(vessels::add);
      } else {
        vessels.add(described.vesselOfAnySize(id));
      }
    }
    if (vessels.isEmpty()) {
      throw new BadInputException(
          log
              + " speaks of "
              + String.join(", ", named)
              + ", of which none is "
              + (ids.isEmpty() ? "in " + cellar : String.join(", ", ids))
              + "; name one with --vessel");
    }
    return new Played(file, vessels, read.map(Cellar::alarms).orElse(AlarmSettings.DEFAULT));
  }

  private static Optional<String> onlyOf(Optional<Cellar> read) {
    return read.map(Cellar::vessels).filter(v -> v.size() == 1).map(v -> v.get(0).id());
  }
}
