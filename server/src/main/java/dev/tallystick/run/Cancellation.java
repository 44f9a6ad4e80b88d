package dev.tallystick.run;

/**
 * Asked by long loops whether their result is still wanted.
 *
 * <p>Cancelling never interrupts a thread: a loop stops only where it calls {@link #check()}.
 */
@FunctionalInterface
public interface Cancellation {
  /** Never cancelled: for the command line and for tests. */
  Cancellation NONE = () -> false;

  /** Whether the result is no longer wanted. */
  boolean cancelled();

  /**
   * Leaves the computation when its result is no longer wanted.
   *
   * @throws Cancelled if so; caught at one place, where the work was started
   */
  default void check() {
    if (cancelled()) {
      throw new Cancelled();
    }
  }

  /** Unwinds a computation nobody waits for any more. Carries no stack trace. */
  final class Cancelled extends RuntimeException {
    private static final long serialVersionUID = 1L;

    Cancelled() {
      super("no longer wanted", null, false, false);
    }
  }
}
