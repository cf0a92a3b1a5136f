package tunwarden.screen.view;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tunwarden.assess.Rung;

/** Rungs stand in order, on distinct rows, and at their true place wherever there is room. */
class LadderLayoutTest {
  @Test
  void rungsWithRoomStandWhereTheirPressureSays() {
    List<Rung> rungs =
        List.of(rung(Rung.Kind.RELIEF_SET, 150_000), rung(Rung.Kind.NOW, 75_000), rung(null, 0));
    LadderLayout layout = LadderLayout.of(rungs, 31);
    for (int i = 0; i < rungs.size(); i++) {
      assertEquals(layout.trueRow(rungs.get(i).paGauge()), layout.labelRow()[i]);
    }
    assertEquals(15, layout.labelRow()[1], "half the pressure stands half way up");
  }

  @Test
  void rungsThatCollideSpreadAboutTheirPlaceAndKeepOrder() {
    assertArrayEquals(new int[] {4, 5, 6}, LadderLayout.spread(new double[] {5, 5, 5}, 20));
    assertArrayEquals(new int[] {0, 1, 9}, LadderLayout.spread(new double[] {0, 0, 9}, 20));
    assertArrayEquals(new int[] {17, 18, 19}, LadderLayout.spread(new double[] {19, 19, 19}, 20));
  }

  @Test
  void anyLadderKeepsOrderOnDistinctRowsWithinTheScale() {
    Random random = new Random(11);
    for (int round = 0; round < 2_000; round++) {
      int rows = 1 + random.nextInt(30);
      List<Rung> rungs = new ArrayList<>();
      rungs.add(rung(Rung.Kind.NOW, random.nextDouble() * 2e5));
      for (int i = random.nextInt(14); i > 0; i--) {
        rungs.add(rung(Rung.Kind.FORECAST, (random.nextDouble() - 0.1) * 3e5));
      }
      rungs.sort(Comparator.comparingDouble(Rung::paGauge).reversed());
      LadderLayout layout = LadderLayout.of(rungs, rows);
      assertEquals(Math.min(rows, rungs.size()), layout.rungs().size());
      for (int i = 0; i < layout.rungs().size(); i++) {
        int row = layout.labelRow()[i];
        assertTrue(row >= 0 && row < rows);
        if (i > 0) {
          assertTrue(row > layout.labelRow()[i - 1]);
          assertTrue(layout.rungs().get(i - 1).paGauge() >= layout.rungs().get(i).paGauge());
        }
      }
      assertTrue(
          layout.rungs().stream().anyMatch(r -> r.kind() == Rung.Kind.NOW),
          "the present pressure is never left out");
    }
  }

  @Test
  void aValueThatIsNoNumberIsLeftOut() {
    List<Rung> rungs = List.of(rung(Rung.Kind.FORECAST, Double.NaN), rung(Rung.Kind.NOW, 50_000));
    assertEquals(1, LadderLayout.of(rungs, 10).rungs().size());
  }

  private static Rung rung(Rung.Kind kind, double paGauge) {
    return new Rung(kind == null ? Rung.Kind.ATMOSPHERE : kind, paGauge, "rung");
  }
}
