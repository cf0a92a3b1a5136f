package tunwarden.serial;

/** An open serial line, owned by one thread. */
public interface ByteLink extends AutoCloseable {
  /**
   * Takes what has arrived, waiting for the first byte at most so long.
   *
   * @param buffer filled from its beginning
   * @param waitMs longest wait, ms
   * @return how many bytes; 0 when none came in time
   * @throws PortException when the port is gone
   */
  int read(byte[] buffer, int waitMs) throws PortException;

  /**
   * Sends all bytes.
   *
   * @throws PortException when the port is gone
   */
  void write(byte[] bytes) throws PortException;

  /** Closes the line; a second call does nothing. */
  @Override
  void close();
}
