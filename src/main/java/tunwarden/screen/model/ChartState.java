package tunwarden.screen.model;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;

/**
 * What part of the past the chart shows.
 *
 * @param spanS length of the past shown, s
 * @param heldEnd where the past shown ends; empty follows the present
 * @param cursor the moment whose values are read out, if any
 * @param fullScale whether the pressure scale reaches from atmosphere to relief setting
 */
public record ChartState(
    long spanS, Optional<Instant> heldEnd, Optional<Instant> cursor, boolean fullScale) {
  /** The spans offered first, s: 10 min, 2 h, 24 h, 7 d. */
  private static final long[] SPANS = {600, 7_200, 86_400, 604_800};

  private static final long LEAST_SPAN_S = 60;
  private static final long MOST_SPAN_S = 31L * 86_400;

  /** Steps of the cursor across the whole span. */
  private static final int CURSOR_STEPS = 80;

  private static final int PAN_STEPS = 4;

  /** The last two hours, following the present. */
  public static final ChartState USUAL =
      new ChartState(SPANS[1], Optional.empty(), Optional.empty(), false);

  /** End of the past shown, given the present. */
  public Instant end(Instant now) {
    return heldEnd.orElse(now);
  }

  public Instant start(Instant now) {
    return end(now).minusSeconds(spanS);
  }

  /** The next of the offered spans. */
  public ChartState nextSpan() {
    for (long span : SPANS) {
      if (span > spanS) {
        return withSpan(span);
      }
    }
    return withSpan(SPANS[0]);
  }

  /** Half the span, about the cursor if there is one. */
  public ChartState zoomIn(Instant now) {
    return zoom(now, Math.max(LEAST_SPAN_S, spanS / 2));
  }

  /** Twice the span. */
  public ChartState zoomOut(Instant now) {
    return zoom(now, Math.min(MOST_SPAN_S, spanS * 2));
  }

  private ChartState zoom(Instant now, long span) {
    if (cursor.isEmpty()) {
      return withSpan(span);
    }
    double share = Duration.between(start(now), cursor.get()).toMillis() / (1000.0 * spanS);
    Instant newEnd = cursor.get().plusMillis((long) (1000 * span * (1 - share)));
    Optional<Instant> held = newEnd.isBefore(now) ? Optional.of(newEnd) : Optional.empty();
    return new ChartState(span, held, cursor, fullScale);
  }

  /**
   * A quarter of the span back (negative) or forth; following again once the present is reached.
   */
  public ChartState pan(Instant now, int direction) {
    Instant moved = end(now).plusSeconds(direction * Math.max(1, spanS / PAN_STEPS));
    Optional<Instant> held = moved.isBefore(now) ? Optional.of(moved) : Optional.empty();
    return new ChartState(spanS, held, cursor, fullScale);
  }

  /** The cursor one step on; the first step puts it at the end of what is shown. */
  public ChartState moveCursor(Instant now, int direction) {
    Instant from = cursor.orElse(end(now));
    Instant moved = from.plusMillis(direction * spanS * 1000 / CURSOR_STEPS);
    Instant least = start(now);
    Instant most = end(now);
    Instant kept = moved.isBefore(least) ? least : moved.isAfter(most) ? most : moved;
    return new ChartState(spanS, heldEnd, Optional.of(kept), fullScale);
  }

  public ChartState withoutCursor() {
    return new ChartState(spanS, heldEnd, Optional.empty(), fullScale);
  }

  /** Follows the present again, without a cursor. */
  public ChartState follow() {
    return new ChartState(spanS, Optional.empty(), Optional.empty(), fullScale);
  }

  public ChartState toggleScale() {
    return new ChartState(spanS, heldEnd, cursor, !fullScale);
  }

  private ChartState withSpan(long span) {
    return new ChartState(span, heldEnd, cursor, fullScale);
  }
}
