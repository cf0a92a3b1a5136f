package tunwarden.screen.model;

import java.util.List;
import java.util.Optional;

/**
 * Everything that decides what is on the screen. Immutable.
 *
 * @param board what is known
 * @param look units, theme, glyphs
 * @param size of the screen
 * @param page the page shown
 * @param help whether its keys are shown over it
 * @param chosen identity of the vessel looked at; may be empty or gone
 * @param listing which vessels, in what order
 * @param chart what part of the past
 * @param whatIf the table of what may happen
 * @param vent the vent being tried
 * @param journal where in the journal
 * @param prompt the question being asked, if any
 * @param said the newest sentence from the desk; empty for none
 * @param over whether the person has left
 */
public record Model(
    Board board,
    Look look,
    Size size,
    Page page,
    boolean help,
    String chosen,
    Listing listing,
    ChartState chart,
    WhatIfState whatIf,
    VentState vent,
    JournalState journal,
    Optional<Prompt> prompt,
    String said,
    boolean over) {

  /** The cellar page, as on starting. */
  public static Model start(Board board, Look look, Size size) {
    return new Model(
        board,
        look,
        size,
        Page.CELLAR,
        false,
        "",
        Listing.ALL,
        ChartState.USUAL,
        WhatIfState.SHUT,
        VentState.USUAL,
        JournalState.TOP,
        Optional.empty(),
        "",
        false);
  }

  /** The vessels listed, in order. */
  public List<VesselBoard> listed() {
    return listing.of(board);
  }

  /** The vessel looked at: the chosen one, or else the first listed. */
  public Optional<VesselBoard> vessel() {
    Optional<VesselBoard> found = board.vessel(chosen);
    return found.isPresent() ? found : listed().stream().findFirst();
  }

  public Model withBoard(Board other) {
    return edit().board(other).done();
  }

  public Model withSize(Size other) {
    return edit().size(other).done();
  }

  public Model withSaid(String sentence) {
    return edit().said(sentence).done();
  }

  ModelEdit edit() {
    return new ModelEdit(this);
  }
}
