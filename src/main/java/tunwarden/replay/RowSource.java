package tunwarden.replay;

import java.io.Closeable;
import java.io.IOException;

/** Rows in the order of their times. */
public interface RowSource extends Closeable {
  /**
   * The next row, or null when there are no more.
   *
   * @throws IOException when the source fails
   * @throws BadLogException when what it holds is no log
   */
  LogRow next() throws IOException;

  @Override
  default void close() throws IOException {}

  /** Opens the same rows from the first again. */
  interface Supplier {
    RowSource open() throws IOException;
  }
}
