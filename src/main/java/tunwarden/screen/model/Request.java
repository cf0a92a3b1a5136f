package tunwarden.screen.model;

/** Something to ask of the desk, decided by the pure update and carried out by its caller. */
@FunctionalInterface
public interface Request {
  /** Asks, and returns the sentence for the person; may be empty. */
  String of(Desk desk);
}
