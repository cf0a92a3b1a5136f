package tunwarden.simulate;

import java.util.List;
import tunwarden.vessel.Vessel;

/**
 * One simulated log.
 *
 * @param vessel the vessel as its user describes it: nominal fill, nothing about air or rates
 * @param rows the log with its truth
 * @param incidents what happened
 * @param judgedFrom seconds after which the error is judged
 * @param laboratoryU95 uncertainty stated with laboratory values, kg/m3
 */
public record Simulation(
    Vessel vessel,
    List<Row> rows,
    List<Incident> incidents,
    double judgedFrom,
    double laboratoryU95) {}
