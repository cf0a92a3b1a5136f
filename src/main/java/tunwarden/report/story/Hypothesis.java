package tunwarden.report.story;

import java.util.ArrayList;
import java.util.List;

/** A possible cause with what speaks for it and against it; never a verdict. */
public final class Hypothesis {
  private final String cause;
  private final List<String> evidenceFor = new ArrayList<>();
  private final List<String> evidenceAgainst = new ArrayList<>();

  Hypothesis(String cause) {
    this.cause = cause;
  }

  Hypothesis speaksFor(String evidence) {
    evidenceFor.add(evidence);
    return this;
  }

  Hypothesis against(String evidence) {
    evidenceAgainst.add(evidence);
    return this;
  }

  /** What may have driven it. */
  public String cause() {
    return cause;
  }

  /** How it stands, by the evidence listed. */
  public String standing() {
    if (evidenceFor.isEmpty()) {
      return evidenceAgainst.isEmpty() ? "nothing speaks for or against it" : "unlikely";
    }
    return evidenceAgainst.isEmpty() ? "fits" : "open";
  }

  public List<String> evidenceFor() {
    return evidenceFor;
  }

  public List<String> evidenceAgainst() {
    return evidenceAgainst;
  }
}
