package tunwarden.app;

import java.io.IOException;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tunwarden.alarm.AlarmSettings;
import tunwarden.app.board.LogDashboard;
import tunwarden.app.options.ScreenOptions;
import tunwarden.app.options.VesselOptions;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Vessel;

/** {@code replay}: the dashboard over a recorded or foreign log. */
@Command(
    name = "replay",
    description = "Plays a recorded log, also another logger's CSV, through the dashboard.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden replay replay-logs/cooling-lost.csv --pace 60 --volume 2000L --fill 1800L \\",
      "      --liquid beer --relief '1.5 bar'",
      "  tunwarden replay monday.csv --cellar cellar.toml --vessel FV2"
    })
public final class ReplayCommand implements Callable<Integer> {
  private static final int HEAD_ROWS = 2_000;

  @Parameters(paramLabel = "LOG", description = "The log, CSV, plain or .gz.")
  private Path log;

  @Option(names = "--cellar", paramLabel = "F", description = "Cellar file with the vessels.")
  private Path cellarFile;

  @Option(names = "--vessel", paramLabel = "ID", description = "Show this vessel only.")
  private String only;

  @Option(
      names = "--pace",
      paramLabel = "N",
      description = "Times real time, above 0 to 10000 (default: ${DEFAULT-VALUE}).",
      defaultValue = "60")
  private double pace;

  @Option(names = "--zone", paramLabel = "ZONE", description = "Zone of times without an offset.")
  private String zone;

  @Option(
      names = "--columns",
      paramLabel = "LIST",
      description = "Which column is what, as time=Zeit,pressure=Druck/mbar.",
      defaultValue = "")
  private String columns;

  @Mixin private VesselOptions vesselOptions = new VesselOptions();
  @Mixin private ScreenOptions screen = new ScreenOptions();

  @Override
  public Integer call() throws IOException {
    if (!(pace > 0) || !(pace <= 10_000)) {
      throw new BadInputException("--pace: write a number above 0 and up to 10000");
    }
    Optional<Cellar> cellar =
        cellarFile == null ? Optional.empty() : Optional.of(CellarFile.read(cellarFile));
    LogFile file = LogFile.open(log, options(cellar));
    List<Vessel> vessels = vessels(file, cellar);
    AlarmSettings alarms = cellar.map(Cellar::alarms).orElse(AlarmSettings.DEFAULT);
    LogDashboard.run(file, vessels, alarms, pace, Fronts.of(screen));
    return 0;
  }

  private LogOptions options(Optional<Cellar> cellar) {
    LogOptions options = LogOptions.NONE.withColumns(columns);
    if (zone != null) {
      options = options.inZone(zone());
    }
    if (only != null) {
      options = options.forVessel(only);
    } else if (cellar.isPresent() && cellar.get().vessels().size() == 1) {
      options = options.forVessel(cellar.get().vessels().get(0).id());
    }
    Vessel described = vesselOptions.vesselOfAnySize(LogOptions.UNNAMED);
    double ambientPa = cellar.map(c -> c.site()).orElse(described.site()).ambientPaAbsolute();
    return options.withAmbient(ambientPa);
  }

  private ZoneId zone() {
    try {
      return ZoneId.of(zone);
    } catch (java.time.DateTimeException e) {
      throw new BadInputException(
          "--zone: there is no time zone '" + zone + "'; write one like Europe/Dublin or +01:00",
          e);
    }
  }

  private List<Vessel> vessels(LogFile file, Optional<Cellar> cellar) throws IOException {
    List<Vessel> found = new ArrayList<>();
    for (String id : idsInHead(file)) {
      if (only != null && !only.equals(id)) {
        continue;
      }
      if (cellar.isPresent()) {
        cellar.get().vessel(id).ifPresent(found::add);
      } else {
        found.add(vesselOptions.vesselOfAnySize(id));
      }
    }
    if (found.isEmpty()) {
      String known = String.join(", ", idsInHead(file));
      throw new BadInputException(
          log
              + ": none of its vessels ("
              + known
              + ") is "
              + (only == null ? "in " + cellarFile : "'" + only + "'")
              + "; name one with --vessel");
    }
    return found;
  }

  private static Set<String> idsInHead(LogFile file) throws IOException {
    Set<String> ids = new LinkedHashSet<>();
    try (RowSource rows = file.open()) {
      for (int i = 0; i < HEAD_ROWS; i++) {
        LogRow row = rows.next();
        if (row == null) {
          break;
        }
        ids.add(row.vessel());
      }
    }
    return ids;
  }
}
