package tunwarden.screen.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import tunwarden.screen.Boards;
import tunwarden.screen.view.ScreenView;
import tunwarden.units.Display;

class WhatIfKeysTest {
  private static Model after(Model start, Key... keys) {
    Model model = start;
    for (Key key : keys) {
      model = Update.key(model, key).model();
    }
    return model;
  }

  private static Model open(Display units) {
    Look look = new Look(units, Theme.DARK, Glyphs.BLOCKS);
    Model start = Model.start(Boards.three(Origin.LIVE, Boards.NOW), look, new Size(80, 24));
    return after(start, Key.typed('v'), Key.typed('f'));
  }

  @Test
  void leftAndRightGoThroughTheRowsAndTheEndsMeet() {
    Model model = open(Display.METRIC);
    int rows = model.vessel().orElseThrow().assessment().outlook().whatIfs().size();
    assertEquals(rows - 1, after(model, Key.of(Key.Kind.LEFT)).whatIf().chosen());
    assertEquals(1, after(model, Key.of(Key.Kind.RIGHT)).whatIf().chosen());
    assertTrue(after(model, Key.of(Key.Kind.RIGHT)).chart().cursor().isEmpty());
  }

  @Test
  void escapeBringsTheChartBackAndStaysOnThePage() {
    Model model = after(open(Display.METRIC), Key.of(Key.Kind.ESCAPE));
    assertFalse(model.whatIf().open());
    assertEquals(Page.VESSEL, model.page());
    assertFalse(after(open(Display.METRIC), Key.typed('f')).whatIf().open());
  }

  @Test
  void aVesselOfWhichNothingIsForecastSaysSo() {
    Model model = open(Display.METRIC);
    while (!model.vessel().orElseThrow().id().equals("CK4")) {
      model = after(model, Key.of(Key.Kind.DOWN));
    }
    assertTrue(ScreenView.draw(model).text().contains("Nothing is forecast until"));
  }

  /** 1.50 bar = 21.8 psi, 8.00 bar = 116.0 psi, 24 °C = 75.2 °F. */
  @Test
  void everyNumberOfTheTableIsInTheChosenUnits() {
    Model model = after(open(Display.US), Key.of(Key.Kind.RIGHT));
    String text = ScreenView.draw(model).text();
    assertTrue(text.contains("warmed to 75.2 °F"), text);
    assertTrue(text.contains("116.0"), text);
    assertTrue(text.contains("the setting of 21.8 psi g in 55 s"), text);
    assertFalse(text.contains("bar g"), text);
  }
}
