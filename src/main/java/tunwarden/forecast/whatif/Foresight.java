package tunwarden.forecast.whatif;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.ForwardPoint;
import tunwarden.estimate.State;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Forecaster;
import tunwarden.forecast.Hindsight;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.forecast.WhatIf;
import tunwarden.vessel.Vessel;

/** The whole set of forecasts of one vessel: its trend, and all that may happen to it. Pure. */
public final class Foresight {
  private Foresight() {}

  /**
   * The futures of a vessel that an estimator watches; none before it believes anything.
   *
   * @param vessel its description
   * @param state the estimator's
   * @param seen what the readings have taught beside it
   */
  public static Outlook outlook(Vessel vessel, State state, Hindsight seen) {
    return state
        .estimate()
        .map(estimate -> outlook(Present.of(vessel, estimate), Forecaster.ahead(state), seen))
        .orElse(Outlook.NONE);
  }

  /**
   * The futures of a vessel; {@link Outlook#NONE} where its state makes no sense to the model.
   *
   * @param present the vessel
   * @param ahead the estimator's own forward run; empty where there is none
   * @param seen what the readings have taught
   */
  public static Outlook outlook(Present present, List<ForwardPoint> ahead, Hindsight seen) {
    if (!Forecaster.isSensible(present)) {
      return Outlook.NONE;
    }
    Ensemble ensemble = Ensemble.of(present);
    Outlook outlook = Forecaster.outlook(ensemble, ahead, seen.rise());
    return outlook.with(whatIfs(ensemble, outlook, seen));
  }

  private static List<WhatIf> whatIfs(Ensemble ensemble, Outlook outlook, Hindsight seen) {
    Optional<WarmingTime> warming =
        WarmingTime.of(ensemble.present().vessel().prospects(), seen.warming());
    List<WhatIf> all = new ArrayList<>();
    Temperatures.warmed(ensemble, outlook, warming).ifPresent(all::add);
    Supplies.failedOpen(ensemble).ifPresent(all::add);
    Ferments.closed(ensemble, seen.gravity()).ifPresent(all::add);
    Ferments.held(ensemble).ifPresent(all::add);
    ReliefShares.of(ensemble.present(), warming).ifPresent(all::add);
    Vacuums.vented(outlook).ifPresent(all::add);
    Temperatures.cooled(ensemble, outlook).ifPresent(all::add);
    Vacuums.drawnOff(ensemble).ifPresent(all::add);
    Vacuums.caustic(ensemble).ifPresent(all::add);
    Temperatures.full(ensemble, outlook).ifPresent(all::add);
    all.sort(Comparator.comparing(WhatIf::kind));
    return all;
  }
}
