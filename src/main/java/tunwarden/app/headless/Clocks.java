package tunwarden.app.headless;

import java.time.InstantSource;
import java.util.function.LongSupplier;

/**
 * The clocks of a computer.
 *
 * @param wall what a person would read off; can be stepped
 * @param nanos only ever runs forward, ns
 */
record Clocks(InstantSource wall, LongSupplier nanos) {}
