package tunwarden.estimate;

import java.util.Optional;

/** Everything an estimator remembers about one vessel; immutable, so any state can be kept. */
public interface State {
  /** The present belief; empty until a pressure and a temperature have been seen. */
  Optional<Estimate> estimate();
}
