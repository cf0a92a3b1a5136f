package tunwarden.notice;

import java.io.IOException;

/** One way to reach a person. */
public interface Channel {
  /** Name for folders and messages: {@code command}, {@code mail}, {@code webhook}. */
  String name();

  /**
   * Delivers a message, within a minute at the very most.
   *
   * @throws IOException when it was not delivered; the sentence holds no secret
   */
  void send(Message message) throws IOException;
}
