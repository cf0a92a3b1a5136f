package tunwarden.bench;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.SplittableRandom;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.rehearse.SimulatedVessel;
import tunwarden.rehearse.Valves;
import tunwarden.replay.text.Decimals;
import tunwarden.units.Constants;

/**
 * Writes a long log at one row a second: a bright tank of 20 hL that is cooled, vented every third
 * day, charged after it, and loses its cooling for half a day each month until its valve lifts;
 * with a gauge that is noisy, spikes once a week and is silent for a while twice a month. A program
 * to run by hand: {@code YearLog FILE DAYS}.
 */
public final class YearLog {
  private static final long START_S = Instant.parse("2025-01-01T00:00:00Z").getEpochSecond();
  private static final int DAY_S = 86_400;
  private static final double COLD_K = Constants.ZERO_CELSIUS_K + 4;
  private static final double BAR = 1e5;
  private static final double NOISE_PA = 60;
  private static final double NOISE_K = 0.02;

  private final SplittableRandom random = new SplittableRandom(1);
  private final SimulatedVessel vessel =
      new SimulatedVessel(
          new SimulatedVessel.Build(
              2.0, 1.8, Liquid.of(LiquidKind.BEER), 101_325, 2e-5, 6 * 3600, 120),
          COLD_K);
  private final StringBuilder line = new StringBuilder(64);
  private final byte[] bytes = new byte[64];

  private YearLog() {
    vessel.fill(1.0 * BAR, 0, 1);
    vessel.valves().relief(new Valves.Relief(1.45 * BAR, 1.3 * BAR, 1e-4));
  }

  /** Writes the file, then its number of rows to standard output. */
  public static void main(String[] args) throws IOException {
    Path file = Path.of(args[0]);
    Files.createDirectories(file.toAbsolutePath().getParent());
    try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file), 1 << 20)) {
      System.out.println(new YearLog().write(out, Long.parseLong(args[1]) * DAY_S));
    }
  }

  private long write(OutputStream out, long seconds) throws IOException {
    out.write("time,pressure_bar_g,temperature_c\n".getBytes(StandardCharsets.US_ASCII));
    long rows = 0;
    for (long t = 0; t < seconds; t++) {
      act(t);
      vessel.advance(1);
      if (t % (15 * DAY_S) < 5 * DAY_S || t % (15 * DAY_S) > 5 * DAY_S + 1200) {
        row(t);
        out.write(bytes, 0, line.length());
        rows++;
      }
    }
    return rows;
  }

  private void act(long t) {
    long day = t / DAY_S;
    long second = t % DAY_S;
    boolean lost = day % 30 == 20 && second > 6 * 3600 && second < 20 * 3600;
    double wave = 0.3 * Math.sin(2 * Math.PI * second / 2600.0);
    vessel.surroundings(lost ? COLD_K + 18 : COLD_K + wave);
    boolean vents = day % 3 == 1 && second >= 36_000 && second < 36_020;
    vessel.valves().vent(vents ? 1e-4 : 0);
    if (day % 3 == 1 && second == 50_000) {
      vessel.valves().supply(1.05 * BAR);
    } else if (day % 3 == 1 && second == 53_000) {
      vessel.valves().noSupply();
    }
  }

  private void row(long t) {
    boolean spike = t % (7 * DAY_S) == 4 * DAY_S + 77;
    double pa = vessel.paGauge() + noise(NOISE_PA) + (spike ? 0.3 * BAR : 0);
    double celsius = vessel.temperatureK() - Constants.ZERO_CELSIUS_K + noise(NOISE_K);
    line.setLength(0);
    line.append(Instant.ofEpochSecond(START_S + t)).append(',');
    Decimals.append(line, pa / BAR, 5);
    line.append(',');
    Decimals.append(line, celsius, 3);
    line.append('\n');
    for (int i = 0; i < line.length(); i++) {
      bytes[i] = (byte) line.charAt(i);
    }
  }

  /** Near enough to a bell curve, and cheap. */
  private double noise(double sigma) {
    double sum = 0;
    for (int i = 0; i < 4; i++) {
      sum += random.nextDouble() - 0.5;
    }
    return sigma * sum * Math.sqrt(3);
  }
}
