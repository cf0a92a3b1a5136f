package tunwarden.screen.model;

import java.util.Optional;

/** A model being changed; never leaves the method that asked for it. */
final class ModelEdit {
  private Board board;
  private Look look;
  private Size size;
  private Page page;
  private boolean help;
  private String chosen;
  private Listing listing;
  private ChartState chart;
  private WhatIfState whatIf;
  private VentState vent;
  private JournalState journal;
  private Optional<Prompt> prompt;
  private String said;
  private boolean over;

  ModelEdit(Model from) {
    board = from.board();
    look = from.look();
    size = from.size();
    page = from.page();
    help = from.help();
    chosen = from.chosen();
    listing = from.listing();
    chart = from.chart();
    whatIf = from.whatIf();
    vent = from.vent();
    journal = from.journal();
    prompt = from.prompt();
    said = from.said();
    over = from.over();
  }

  ModelEdit board(Board other) {
    board = other;
    return this;
  }

  ModelEdit look(Look other) {
    look = other;
    return this;
  }

  ModelEdit size(Size other) {
    size = other;
    return this;
  }

  ModelEdit page(Page other) {
    page = other;
    return this;
  }

  ModelEdit help(boolean shown) {
    help = shown;
    return this;
  }

  ModelEdit chosen(String id) {
    chosen = id;
    return this;
  }

  ModelEdit listing(Listing other) {
    listing = other;
    return this;
  }

  ModelEdit chart(ChartState other) {
    chart = other;
    return this;
  }

  ModelEdit whatIf(WhatIfState other) {
    whatIf = other;
    return this;
  }

  ModelEdit vent(VentState other) {
    vent = other;
    return this;
  }

  ModelEdit journal(JournalState other) {
    journal = other;
    return this;
  }

  ModelEdit ask(Prompt question) {
    prompt = Optional.of(question);
    return this;
  }

  ModelEdit answered() {
    prompt = Optional.empty();
    return this;
  }

  ModelEdit said(String sentence) {
    said = sentence;
    return this;
  }

  ModelEdit over() {
    over = true;
    return this;
  }

  Model done() {
    return new Model(
        board, look, size, page, help, chosen, listing, chart, whatIf, vent, journal, prompt, said,
        over);
  }
}
