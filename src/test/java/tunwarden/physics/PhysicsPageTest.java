package tunwarden.physics;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.Tsonopoulos1974;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.liquid.OimlR22;
import tunwarden.physics.liquid.SugarWater;
import tunwarden.physics.site.StandardAtmosphere;
import tunwarden.physics.solubility.LiquidSolubility;

/** The page names every correlation the program may name, and every one says what it should. */
class PhysicsPageTest {
  private static Set<Correlation> all() {
    Set<Correlation> found = new LinkedHashSet<>();
    found.add(Kell1975.ABOUT);
    found.add(OimlR22.ABOUT);
    found.add(SugarWater.ABOUT);
    found.add(Tsonopoulos1974.ABOUT);
    found.add(StandardAtmosphere.ABOUT);
    for (LiquidKind kind : LiquidKind.values()) {
      for (BeerMethod method : BeerMethod.values()) {
        Liquid liquid =
            new Liquid(
                kind,
                OptionalDouble.of(0.05),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                method,
                Map.of("NaCl", 1.0));
        for (Gas gas : Gas.values()) {
          found.addAll(LiquidSolubility.of(liquid).correlations(gas));
        }
      }
    }
    return found;
  }

  @Test
  void everyCorrelationIsOnThePage() throws IOException {
    String page = Files.readString(Path.of("src/site/markdown/physics.md"));
    for (Correlation correlation : all()) {
      assertTrue(page.contains(correlation.name()), () -> correlation.name() + " is missing");
    }
  }

  @Test
  void everyCorrelationCarriesItsSourceErrorAndRange() {
    assertTrue(all().size() > 20);
    for (Correlation correlation : all()) {
      assertFalse(correlation.citation().isBlank());
      assertFalse(correlation.statedError().isBlank());
      assertTrue(correlation.validity().leastK() < correlation.validity().mostK());
      assertTrue(correlation.breach(Double.NaN, 1e5).isPresent());
      assertTrue(
          correlation.breach(5000, 1e5).isPresent() || correlation.name().equals("ISO 2533"));
    }
  }
}
