package dev.tallystick.engine;

import dev.tallystick.run.Cancellation;

/** One state of one pair, for a worker to examine. */
public final class Task implements Cancellation {
  private final FilePair files;
  private final Sheet source;
  private final Sheet target;
  private volatile boolean dropped;

  Task(FilePair files, Sheet source, Sheet target) {
    this.files = files;
    this.source = source;
    this.target = target;
  }

  FilePair files() {
    return files;
  }

  Sheet source() {
    return source;
  }

  Sheet target() {
    return target;
  }

  /** Nobody wants the result any more. */
  void drop() {
    dropped = true;
  }

  @Override
  public boolean cancelled() {
    return dropped || source.outdated() || target.outdated();
  }
}
