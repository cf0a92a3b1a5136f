package tunwarden.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tunwarden.physics.closed.ClosedSolver;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.solubility.GasLine;
import tunwarden.physics.solubility.LiquidSolubility;

/**
 * Speed of the equilibrium engine: at most 200 ns for one dissolved-gas evaluation, 1 µs for one
 * closed-vessel solve, nothing allocated ({@code -prof gc}). How to run it stands in
 * src/site/markdown/physics.md.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class PhysicsBench {
  private static final double COLD_K = 277.15;
  private static final int TEMPERATURES = 64;

  @Param({"WATER", "BEER"})
  public LiquidKind kind;

  @Param({"0", "5000"})
  public double airPa;

  private LiquidSolubility solubility;
  private GasLine line;
  private GasLine moving;
  private ClosedSolver solver;
  private double[] mol;
  private int turn;

  /** A vessel of 2 m³, nine tenths full, at 2 bar absolute and 4 °C. */
  @Setup
  public void fill() {
    solubility = LiquidSolubility.of(Liquid.of(kind));
    line = solubility.line(Gas.CO2).prepareAt(COLD_K);
    moving = solubility.line(Gas.CO2);
    ClosedVessel vessel = new ClosedVessel(2, 1.8, COLD_K, Liquid.of(kind));
    mol = vessel.inventoryAt(2e5, COLD_K, GasMix.CO2, airPa).toArray();
    solver = vessel.solver();
  }

  /** A temperature that differs from call to call, so that nothing prepared can be kept. */
  private double temperature() {
    turn = (turn + 1) % TEMPERATURES;
    return COLD_K + 0.25 * turn;
  }

  /** Dissolved CO2 from pressure and a new temperature. */
  @Benchmark
  public double dissolved() {
    return moving.prepareAt(temperature()).dissolvedKgPerM3(1.9e5, 2e5);
  }

  /** The same in one call, which makes a short-lived line. */
  @Benchmark
  public double dissolvedInOneCall() {
    return solubility.dissolvedKgPerM3(Gas.CO2, 1.9e5, 2e5, temperature());
  }

  /** Dissolved CO2 at a temperature prepared for. */
  @Benchmark
  public double dissolvedPrepared() {
    turn = (turn + 1) % TEMPERATURES;
    return line.dissolvedKgPerM3(1.9e5 + turn, 2e5);
  }

  /** The inverse at a temperature prepared for. */
  @Benchmark
  public double partialPrepared() {
    turn = (turn + 1) % TEMPERATURES;
    return line.partialPa(5 + 0.01 * turn, 2e5);
  }

  /** A closed vessel at a new temperature. */
  @Benchmark
  public double closedVessel() {
    solver.settle(mol, temperature());
    return solver.totalPaAbsolute();
  }
}
