package tunwarden.vessel;

/**
 * The room the gas goes into.
 *
 * @param volumeM3 free volume, m³
 * @param airChangesPerS ventilation, room volumes per second
 */
public record Room(double volumeM3, double airChangesPerS) {}
