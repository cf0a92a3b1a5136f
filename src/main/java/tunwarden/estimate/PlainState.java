package tunwarden.estimate;

import java.util.Optional;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.gate.Track;

/** Memory of {@link PlainEstimator}. */
record PlainState(Medium medium, Track pressure, Track temperature, Optional<Estimate> estimate)
    implements State {
  PlainState withTracks(Track newPressure, Track newTemperature) {
    return new PlainState(medium, newPressure, newTemperature, estimate);
  }
}
