package tunwarden.physics.uncertainty;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * JCGM 100:2008 example H.2, simultaneous resistance and reactance. Inputs as printed there and in
 * reference/gum_tests.csv; the printed results keep unrounded inputs, so the last digit may differ
 * by one.
 */
class GumValidation {
  private static final double[] VALUE = {4.9990, 19.6610e-3, 1.04446};
  private static final double[] STANDARD = {0.0032, 0.0095e-3, 0.00075};
  private static final double[][] CORRELATION = {
    {1, -0.36, 0.86}, {-0.36, 1, -0.65}, {0.86, -0.65, 1}
  };

  private static final Propagated RESULT =
      LinearPropagation.correlated(VALUE, STANDARD, CORRELATION)
          .through(
              List.of(
                  x -> x[0] / x[1] * Math.cos(x[2]),
                  x -> x[0] / x[1] * Math.sin(x[2]),
                  x -> x[0] / x[1]));

  /** Values seen in a public copy of the example. */
  @Test
  void valuesAreThoseOfTheExample() {
    assertEquals(127.732, RESULT.value(0), 0.0005);
    assertEquals(219.85, RESULT.value(1), 0.005);
    assertEquals(254.26, RESULT.value(2), 0.005);
  }

  /** Recomputed to five digits from the printed inputs; printed 0.071, 0.295, 0.236 (memory). */
  @Test
  void uncertaintiesAreThoseOfTheExample() {
    assertEquals(0.06998, RESULT.standard(0), 0.00001);
    assertEquals(0.29572, RESULT.standard(1), 0.00001);
    assertEquals(0.23660, RESULT.standard(2), 0.00001);
  }

  /** −0.591 and 0.9928 recomputed; −0.588, −0.485, 0.993 printed (memory). */
  @Test
  void correlationsAreThoseOfTheExample() {
    assertEquals(-0.591, RESULT.correlation(0, 1), 0.0005);
    assertEquals(-0.49, RESULT.correlation(0, 2), 0.006);
    assertEquals(0.9928, RESULT.correlation(1, 2), 0.0001);
  }

  /** JCGM 101 9.2.2: the sum of four unit normals; from memory. */
  @Test
  void fourUnitNormalsAddToTwo() {
    Propagated sum =
        LinearPropagation.independent(new double[4], new double[] {1, 1, 1, 1})
            .through(x -> x[0] + x[1] + x[2] + x[3]);
    assertEquals(2.0, sum.standard(), 1e-12);
    assertEquals(3.92, sum.u95(), 0.001);
  }
}
