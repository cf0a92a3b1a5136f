package tunwarden.physics;

import java.util.Optional;

/**
 * What is known about a published correlation, as data beside its code.
 *
 * @param name the name it is cited by
 * @param citation where it was published
 * @param validity where it holds
 * @param statedError how good it is, in words
 * @param standing how its constants reached this program
 */
public record Correlation(
    String name, String citation, Validity validity, String statedError, Standing standing) {

  /** How the constants of a correlation reached this program. */
  public enum Standing {
    /** Read in a copy of the publication or in several independent transcriptions of it. */
    SEEN,
    /** Fitted or computed here from published data. */
    COMPUTED,
    /** Recalled, no copy found. */
    FROM_MEMORY,
    /** A working estimate of this project. */
    ESTIMATE
  }

  /** A sentence when the state lies outside the validity; empty inside. */
  public Optional<String> breach(double temperatureK, double pressurePaAbsolute) {
    return validity
        .breach(temperatureK, pressurePaAbsolute)
        .map(words -> name + " is used outside its range: " + words);
  }
}
