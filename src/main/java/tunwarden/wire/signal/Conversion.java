package tunwarden.wire.signal;

/** How a scaled number on the wire becomes the quantity, and back (for a simulated instrument). */
public sealed interface Conversion permits Linear, CurrentLoop, ResistanceThermometer {
  /** The quantity in SI, or the reason why there is none. Never throws. */
  Decoded toSi(double scaled);

  /** The number an instrument would send for that quantity, before scale and offset are undone. */
  double fromSi(double si);
}
