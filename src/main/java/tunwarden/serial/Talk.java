package tunwarden.serial;

/** A way of getting values out of an open line. */
interface Talk {
  /**
   * Does what is due and waits a little for what comes; at most about a tenth of a second when
   * nothing is due, so that closing is prompt.
   *
   * @throws PortException when the port is gone
   */
  void turn(ByteLink link) throws PortException;

  /** Begins afresh on a newly opened line. */
  void begin();

  /** What is odd about the line as it stands; {@link LinkState#OPEN} when nothing is. */
  LinkState state();
}
