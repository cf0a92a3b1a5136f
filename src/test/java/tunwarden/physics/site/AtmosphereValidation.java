package tunwarden.physics.site;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import org.junit.jupiter.api.Test;

class AtmosphereValidation {
  /** ISO 2533 table, computed; 1000, 2000, 4000 and 5000 m read in public tests. */
  @Test
  void isTheStandardAtmosphere() {
    for (NamedCsvRecord row : rows("standard_atmosphere")) {
      double altitude = number(row, "geopotential_altitude_m");
      assertEquals(number(row, "p_Pa"), StandardAtmosphere.pa(altitude), 0.15, row::toString);
      assertEquals(altitude, StandardAtmosphere.altitudeM(number(row, "p_Pa")), 0.02);
    }
  }

  @Test
  void isHeldAtItsEdges() {
    double least = StandardAtmosphere.pa(StandardAtmosphere.LEAST_M);
    assertEquals(least, StandardAtmosphere.pa(Double.NEGATIVE_INFINITY));
    assertEquals(StandardAtmosphere.pa(11_000), StandardAtmosphere.pa(1e9));
  }
}
