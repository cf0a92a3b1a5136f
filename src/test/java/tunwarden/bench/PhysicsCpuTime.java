package tunwarden.bench;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Locale;
import java.util.function.IntToDoubleFunction;
import tunwarden.physics.liquid.LiquidKind;

/**
 * The same operations as {@link PhysicsBench} by processor time of the thread instead of the clock,
 * for a machine that is busy with other work: best of twelve rounds. A program to run by hand.
 */
public final class PhysicsCpuTime {
  private static final int CALLS = 200_000;
  private static final int ROUNDS = 12;
  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

  private PhysicsCpuTime() {}

  /** Prints ns per call. */
  public static void main(String[] args) {
    for (LiquidKind kind : new LiquidKind[] {LiquidKind.WATER, LiquidKind.BEER}) {
      for (double air : new double[] {0, 5000}) {
        PhysicsBench bench = new PhysicsBench();
        bench.kind = kind;
        bench.airPa = air;
        bench.fill();
        String name = kind + (air > 0 ? " with air" : "");
        measure(name + " dissolved", turn -> bench.dissolved());
        measure(name + " dissolved, prepared", turn -> bench.dissolvedPrepared());
        measure(name + " inverse, prepared", turn -> bench.partialPrepared());
        measure(name + " closed vessel", turn -> bench.closedVessel());
      }
    }
  }

  private static void measure(String name, IntToDoubleFunction call) {
    double best = Double.MAX_VALUE;
    double sum = 0;
    for (int round = 0; round < ROUNDS; round++) {
      long before = THREADS.getCurrentThreadCpuTime();
      for (int i = 0; i < CALLS; i++) {
        sum += call.applyAsDouble(i);
      }
      best = Math.min(best, (THREADS.getCurrentThreadCpuTime() - before) / (double) CALLS);
    }
    System.out.printf(Locale.ROOT, "%-36s %6.0f ns  (%.6g)%n", name, best, sum);
  }
}
