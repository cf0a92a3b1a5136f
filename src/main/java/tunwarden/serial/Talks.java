package tunwarden.serial;

/** Chooses the way of talking for a plan. */
final class Talks {
  private Talks() {}

  static Talk of(PortPlan plan, Desk desk) {
    return switch (plan.speaks()) {
      case TEXT_LINES -> new StreamTalk(plan, desk);
      case TEXT_QUERY, MODBUS_RTU -> new AskTalk(plan, desk);
    };
  }
}
