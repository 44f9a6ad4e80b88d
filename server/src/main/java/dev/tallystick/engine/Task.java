package dev.tallystick.engine;

import dev.tallystick.align.Judgement;
import dev.tallystick.run.Cancellation;
import java.util.Optional;

/** One state of one pair, for a worker to examine. */
public final class Task implements Cancellation {
  private final FilePair files;
  private final Sheet source;
  private final Sheet target;
  private final boolean draft;
  private final Optional<Judgement> known;
  private volatile boolean dropped;

  Task(FilePair files, Sheet source, Sheet target, boolean draft, Optional<Judgement> known) {
    this.files = files;
    this.source = source;
    this.target = target;
    this.draft = draft;
    this.known = known;
  }

  /** The same, to be learnt from. */
  Task learning() {
    return new Task(files, source, target, draft, Optional.empty());
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

  /** What an earlier state of the texts has taught; empty if these are to be learnt from. */
  Optional<Judgement> known() {
    return known;
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
