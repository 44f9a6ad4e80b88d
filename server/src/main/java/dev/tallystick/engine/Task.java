package dev.tallystick.engine;

import dev.tallystick.run.Cancellation;

/** One state of one pair, for a worker to examine. */
public final class Task implements Cancellation {
  private final FilePair files;
  private final Sheet source;
  private final Sheet target;
  private final boolean draft;
  private volatile boolean dropped;

  Task(FilePair files, Sheet source, Sheet target, boolean draft) {
    this.files = files;
    this.source = source;
    this.target = target;
    this.draft = draft;
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

  /** Whether the translation is still being written. */
  boolean draft() {
    return draft;
  }

  /** Whether it is about these texts, in this state. */
  boolean isAbout(Sheet currentSource, Sheet currentTarget, boolean inDraft) {
    return source == currentSource && target == currentTarget && draft == inDraft;
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
