package tunwarden.screen.model;

import java.util.List;

/**
 * What one key brings about.
 *
 * @param model what is looked at next
 * @param requests what to ask of the desk, in order
 */
public record Turn(Model model, List<Request> requests) {
  static Turn to(Model model) {
    return new Turn(model, List.of());
  }

  static Turn asking(Model model, Request request) {
    return new Turn(model, List.of(request));
  }
}
