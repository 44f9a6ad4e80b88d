package dev.tallystick.run;

/** How a fault of our own is logged. */
public final class Fault {
  private Fault() {}

  /** Its class and its place. Its message is left out: it might quote a file. */
  public static String where(Throwable fault) {
    StackTraceElement[] trace = fault.getStackTrace();
    return fault.getClass().getName() + (trace.length > 0 ? " at " + trace[0] : "");
  }
}
