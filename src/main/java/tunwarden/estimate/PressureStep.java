package tunwarden.estimate;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Front.Flow;
import tunwarden.estimate.Front.Point;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.BankFilter;
import tunwarden.estimate.bank.Expectation;
import tunwarden.estimate.bank.Look;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.bank.Noise;
import tunwarden.estimate.bank.Reader;
import tunwarden.estimate.bank.Summary;
import tunwarden.reading.Reading;

/** The work of one accepted pressure reading; used once and thrown away. */
final class PressureStep {
  private static final double BLOCK_S = 9.9;
  private static final double LEAST_JUMP_PA = 700;
  private static final double JUMP_SHARE = 0.004;
  private static final double JUMP_SDS = 6;
  private static final double LEAST_MOVE = 0.7;
  private static final double QUICK_S = 10;
  private static final double GENTLE_PA_PER_S = 60;
  private static final double COLD_EXPONENT = 0.93;
  private static final double RECOVERY_S = 900;
  private static final int REST_READINGS = 2;

  private final BankState state;
  private final Medium medium;
  private final List<Event> news;
  private final Point point;
  private final Instant time;
  private final double kelvin;
  private final BankFilter filter;
  private final Reader reader;
  private final double trust;
  private Front front;
  private Bank bank;
  private Noise noise;
  private EventBook book;
  private Watch watch;
  private Estimate estimate;
  private String remark = "";

  PressureStep(BankState state, Reading reading, List<Event> news) {
    this.state = state;
    this.news = news;
    medium = state.medium();
    time = reading.time();
    point = new Point(BankEstimator.seconds(time), reading.value());
    kelvin = state.senses().smoothK();
    filter = new BankFilter(medium);
    reader = new Reader(medium);
    front = state.front();
    bank = state.bank();
    noise = state.senses().noise();
    book = state.book();
    watch = state.watch();
    trust = reading.quality().level() == tunwarden.reading.Quality.Level.GOOD ? 1 : 9;
    estimate = state.estimate().orElse(null);
  }

  /** Why a reading was kept back, or empty. */
  String remark() {
    return remark;
  }

  BankState run() {
    if (bank == null || point.atS() < front.last().atS()) {
      begin();
    } else {
      book = GapWatch.arrived(state, book, point, news);
      digest();
    }
    book = ReliefWatch.look(medium.vessel(), book, point, noise, news);
    return new BankState(
        medium, state.senses().withNoise(noise), front, bank, watch, book, Optional.of(estimate));
  }

  private void begin() {
    noise = noise.with(point.paGauge());
    front = Front.start(point);
    bank = filter.begin(kelvin, point.paGauge() + state.ambientPa() - siteShift());
    believe();
  }

  /** The bank counts from the site's ambient; a barometer shifts the gauge reading instead. */
  private double siteShift() {
    return medium.vessel().site().ambientPaAbsolute();
  }

  private void digest() {
    double off = surprise(point);
    double limit = jumpLimit();
    if (front.flow() != null) {
      flowOn(off);
    } else if (front.doubt() != null) {
      resolveDoubt(off, limit);
    } else if (Math.abs(off) > limit
        && !isGentleRise(point)
        && !noise.mayBeOneStep(point.paGauge())) {
      front = front.doubting(point);
      remark = "far from what was expected; waiting for the next reading";
      estimate = Beliefs.carried(estimate, time, point.paGauge(), kelvin);
    } else {
      ordinary();
    }
  }

  /**
   * Whether the pressure rises no faster than a brisk fermentation may drive it in a small
   * headspace: that is for the bank to explain, no gas has come in by a valve.
   */
  private boolean isGentleRise(Point to) {
    double rise = to.paGauge() - front.last().paGauge();
    return rise > 0 && rise <= GENTLE_PA_PER_S * (to.atS() - front.last().atS());
  }

  private double jumpLimit() {
    double absolute = point.paGauge() + state.ambientPa();
    double coarse = noise.coarsePa();
    double random = Math.max(JUMP_SDS * Math.sqrt(noise.scatter()), 2.5 * coarse);
    return Math.max(random, Math.max(LEAST_JUMP_PA, JUMP_SHARE * absolute));
  }

  /** How far a reading lies outside everything the bank expects, Pa; zero inside. */
  private double surprise(Point at) {
    Expectation e = reader.expect(bank);
    double dry = at.paGauge() + state.ambientPa() - medium.vapourPa(kelvin);
    double last = front.last().paGauge() + state.ambientPa() - medium.vapourPa(kelvin);
    double level = front.count() > 0 ? last : e.paDry();
    double from = front.count() > 0 ? front.last().atS() : front.bankS();
    double dt = at.atS() - from;
    double low = Math.min(level, e.paDry()) + 2 * e.slowest() * dt;
    double high = Math.max(level, e.paDry()) + 2 * e.fastest() * dt;
    return dry < low ? dry - low : dry > high ? dry - high : 0;
  }

  private void ordinary() {
    noise = noise.with(point.paGauge());
    front = front.with(point);
    if (point.atS() - front.bankS() >= BLOCK_S) {
      moveBank(front.meanPa(), front.count(), point.atS(), false);
      LossWatch loss = new LossWatch(medium, state.bank(), bank, watch, book);
      loss.look(point, state.front().bankS(), news);
      watch = loss.watch();
      book = loss.book();
      speak();
      believe();
    } else {
      estimate = Beliefs.carried(estimate, time, point.paGauge(), kelvin);
    }
  }

  private void speak() {
    if (point.atS() - watch.saidS() >= Ignorance.EVERY_S || watch.saidS() > point.atS()) {
      watch = watch.saying(point.atS(), Ignorance.words(medium, bank, noise));
    }
  }

  private void believe() {
    BankState now =
        new BankState(medium, state.senses(), front, bank, watch, book, Optional.empty());
    estimate = Beliefs.of(now, bank, time, point.paGauge(), watch.said());
  }

  private void moveBank(double paGauge, int count, double atS, boolean flowing) {
    double dt = Math.max(atS - front.bankS(), 1e-3);
    double absolute = Math.max(paGauge + state.ambientPa(), 1000);
    double variance = trust * noise.variance(dt, count, absolute);
    if (flowing) {
      variance = noise.sd() * noise.sd() + 1e4;
    }
    double swing = Math.abs(state.senses().warmingKPerS()) * dt;
    bank = filter.step(bank, new Look(dt, kelvin, swing, absolute, variance, stage(flowing, atS)));
    front = front.emptied(atS);
  }

  private Look.Stage stage(boolean flowing, double atS) {
    if (flowing) {
      return Look.Stage.FLOWING;
    }
    return atS - front.flowS() < RECOVERY_S ? Look.Stage.RECOVERING : Look.Stage.CALM;
  }

  /** The reading after a surprising one decides: a spike, or gas on the move. */
  private void resolveDoubt(double off, double limit) {
    Point doubt = front.doubt();
    if (Math.abs(off) <= limit) {
      book = spike(doubt);
      noise = noise.aside(doubt.paGauge());
      front = front.doubting(null);
      ordinary();
      return;
    }
    flush();
    Point begin = front.last();
    moveBank(doubt.paGauge(), 1, doubt.atS(), true);
    front = front.with(doubt).emptied(doubt.atS());
    front = front.flowing(new Flow(begin, doubt, doubt, 0));
    flowOn(surprise(point));
  }

  /** Lets the bank see what had been collected before the surprise. */
  private void flush() {
    if (front.count() > 0 && front.last().atS() > front.bankS()) {
      moveBank(front.meanPa(), front.count(), front.last().atS(), false);
    }
  }

  private EventBook spike(Point doubt) {
    Event event =
        new Event(
            EventKind.SPIKE,
            medium.vessel().id(),
            BankEstimator.instant(doubt.atS()),
            BankEstimator.instant(doubt.atS()),
            false,
            front.last().paGauge(),
            doubt.paGauge(),
            0,
            0.9,
            "one reading far from those before and after it");
    news.add(event);
    return book;
  }

  /** While gas moves every reading is taken as it is; two quiet ones end it. */
  private void flowOn(double off) {
    Flow flow = front.flow();
    double change = point.paGauge() - front.last().paGauge();
    double way = flow.moving().paGauge() - flow.begin().paGauge();
    double quiet = Math.max(3 * noise.sd(), 0.3 * jumpLimit());
    boolean moves = Math.abs(off) > quiet && change * way > 0 && !isGentleRise(point);
    moveBank(point.paGauge(), 1, point.atS(), moves);
    front = front.with(point).emptied(point.atS());
    Flow next = moves ? flow.moves(point) : flow.rests();
    front = front.flowing(next);
    if (next.quiet() >= REST_READINGS) {
      endFlow(next);
    }
    believe();
  }

  /**
   * CO2 that left, kg: what the headspace lost, expanding somewhat colder than the liquid where the
   * readings are quick enough to see it, and what the liquid gave meanwhile.
   */
  private double gasKg(Flow flow) {
    double toDry = state.ambientPa() - medium.vapourPa(kelvin);
    double from = Math.max(flow.begin().paGauge() + toDry, 1000);
    double to = Math.max(flow.moving().paGauge() + toDry, 1000);
    Summary now = reader.read(bank);
    double seconds = flow.moving().atS() - flow.begin().atS();
    double middle = 0.5 * (from + to);
    double solubility = medium.solubility(kelvin, middle);
    double co2 = 1 - now.airFraction();
    double perPa = medium.headspace(kelvin, middle, bank.setting().fillKelvin());
    double exponent = front.intervalS() < QUICK_S ? COLD_EXPONENT : 1;
    double headspace = perPa * co2 * from * (1 - Math.pow(to / from, exponent));
    double apart = now.dissolved() - solubility * co2 * middle;
    double liquid = apart * (1 - Math.exp(-now.transfer()[1] * seconds));
    return medium.fillM3() * (headspace + (to < from ? Math.max(0, liquid) : 0));
  }

  private void endFlow(Flow flow) {
    double gasKg = gasKg(flow);
    Event event = FlowEvents.name(medium.vessel(), flow, gasKg, noise);
    double moved = Math.abs(event.toPaGauge() - event.fromPaGauge());
    if (moved > LEAST_MOVE * jumpLimit()) {
      news.add(event);
    }
    if (event.kind() != EventKind.LIFT) {
      bank = filter.valveWorked(bank);
    }
    front = front.flowing(null);
    noise = noise.afterJump();
  }
}
