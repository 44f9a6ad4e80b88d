package dev.tallystick.align;

/**
 * When a translation is on the screen, given its source: {@code scale * time + offset}, since it
 * may be timed for another cut or for other pictures a second. The begin of a link is that of its
 * first units, the end that of its last ones; what parts it inside is as likely without a source.
 * Where either side has no time, the clock says nothing.
 *
 * @param scale target seconds for one second of the source
 * @param offset target time at the start of the source (seconds)
 * @param begins how exact the begins are
 * @param ends how exact the ends are
 */
record Clock(double scale, double offset, Jitter begins, Jitter ends) {
  /** Spread and stray share before anything is known of a pair. */
  private static final double SPREAD = 0.4;

  private static final double STRAY = 0.1;

  /** As sure as one can be before links are known. */
  static Clock start(double scale, double offset, Timeline target) {
    return new Clock(
        scale,
        offset,
        new Jitter(SPREAD, STRAY, Jitter.free(target.step())),
        new Jitter(SPREAD, STRAY, Jitter.free(target.stay())));
  }

  /** How far a target time lies behind the expected one (seconds). */
  double off(double source, double target) {
    return target - scale * source - offset;
  }

  /** The log of how much likelier the source's begin makes the target's. */
  double begins(double source, double target) {
    double off = off(source, target);
    return Double.isNaN(off) ? 0 : begins.logRatio(off);
  }

  /** The same for their ends. */
  double ends(double source, double target) {
    double off = off(source, target);
    return Double.isNaN(off) ? 0 : ends.logRatio(off);
  }
}
