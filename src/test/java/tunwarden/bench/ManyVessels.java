package tunwarden.bench;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Locale;
import java.util.SplittableRandom;

/**
 * Writes a log and a cellar file of many vessels that warm and cool by turns, to see how much
 * memory their dashboard takes. A program to run by hand: {@code ManyVessels FOLDER VESSELS HOURS}.
 */
public final class ManyVessels {
  private static final long START_S = Instant.parse("2026-03-02T00:00:00Z").getEpochSecond();
  private static final int ROW_S = 5;

  private ManyVessels() {}

  /** Writes {@code many.csv} and {@code cellar.toml}. */
  public static void main(String[] args) throws IOException {
    Path folder = Files.createDirectories(Path.of(args[0]));
    int vessels = Integer.parseInt(args[1]);
    SplittableRandom random = new SplittableRandom(24);
    try (BufferedWriter log = Files.newBufferedWriter(folder.resolve("many.csv"))) {
      log.write("time,vessel,pressure_bar_g,temperature_c\n");
      for (long t = 0; t < 3600L * Integer.parseInt(args[2]); t += ROW_S) {
        for (int v = 1; v <= vessels; v++) {
          double swing = Math.sin(t / 9000.0 + v);
          double bar = 0.9 + 0.1 * swing + 0.0006 * (random.nextDouble() - 0.5);
          double celsius = 5 + swing + 0.04 * (random.nextDouble() - 0.5);
          log.write(
              String.format(
                  Locale.ROOT,
                  "%s,T%d,%.5f,%.3f%n",
                  Instant.ofEpochSecond(START_S + t),
                  v,
                  bar,
                  celsius));
        }
      }
    }
    StringBuilder cellar = new StringBuilder("[site]\naltitude = \"120 m\"\n");
    for (int v = 1; v <= vessels; v++) {
      cellar.append("\n[vessel.T" + v + "]\nvolume = \"2000 L\"\nfill = \"1800 L\"\n");
      cellar.append("liquid = { kind = \"beer\" }\nlimits = { relief = \"1.5 bar\" }\n");
      cellar.append("\n[vessel.T" + v + ".readings]\n");
      for (String field : new String[] {"pressure|P", "temperature|T"}) {
        String[] name = field.split("\\|");
        cellar.append(name[0] + " = { device = \"text-line\", port = \"/dev/ttyUSB" + v);
        cellar.append("\", field = \"" + name[1] + "\" }\n");
      }
    }
    Files.writeString(folder.resolve("cellar.toml"), cellar);
  }
}
