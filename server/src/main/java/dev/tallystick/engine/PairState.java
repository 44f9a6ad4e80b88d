package dev.tallystick.engine;

import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import java.util.List;
import java.util.Optional;

/**
 * All that the loop keeps of one pair: the texts it is about, what a worker found in them, and what
 * of it is shown.
 *
 * <p>It is settled when nothing more is to come for the current texts: there is a result, or one
 * text cannot be read, or our own code failed on them.
 */
final class PairState {
  private final FilePair files;
  private Task task;
  private boolean running;
  private Optional<PairResult> result = Optional.empty();
  private HeldBack.Shown shown = HeldBack.Shown.NOTHING;
  private long editedAt;

  PairState(FilePair files) {
    this.files = files;
  }

  FilePair files() {
    return files;
  }

  /** Whether nothing more is to come for the current texts. */
  boolean settled() {
    return !running;
  }

  /**
   * Takes the current texts; whatever was found in others, or is being looked for, is dropped.
   *
   * @return work to be done, if the texts are new and both there
   */
  Optional<Task> take(Optional<Sheet> source, Optional<Sheet> target) {
    if (source.isEmpty() || target.isEmpty()) {
      drop();
      return Optional.empty();
    }
    if (task != null && task.source() == source.get() && task.target() == target.get()) {
      return Optional.empty();
    }
    drop();
    task = new Task(files, source.get(), target.get());
    running = true;
    return Optional.of(task);
  }

  /** The pair is no longer wanted, or its texts are no longer these. */
  void drop() {
    if (task != null) {
      task.drop();
    }
    task = null;
    running = false;
    result = Optional.empty();
  }

  /** Takes a worker's result, unless the texts have moved on. */
  void finish(Task done, Optional<PairResult> found) {
    if (task == done) {
      running = false;
      result = found;
    }
  }

  /** The pair's translation was edited; the turn tells which pair was edited last. */
  void edited(long turn) {
    editedAt = turn;
  }

  /** Decides what is to be shown: all findings but those about what is being written. */
  void show(Optional<Caret.Edited> caret) {
    if (running) {
      return;
    }
    if (result.isEmpty()) {
      shown = HeldBack.Shown.NOTHING;
      return;
    }
    PairResult now = result.get();
    List<Finding> findings =
        caret
            .filter(edited -> files.has(edited.file()))
            .map(edited -> withoutHeld(now, edited))
            .orElse(now.findings());
    shown = new HeldBack.Shown(findings, now.source().text(), now.target().text());
  }

  private List<Finding> withoutHeld(PairResult now, Caret.Edited edited) {
    HeldBack held = new HeldBack(now, files.side(edited.file()), edited.offset());
    return now.findings().stream().filter(finding -> !held.holds(finding, shown)).toList();
  }

  /** The findings that are shown. */
  List<Finding> shown() {
    return shown.findings();
  }

  /** What a side shows. */
  List<Notice> notices(OnSide side, Uris uris) {
    return result
        .map(now -> new Notices(files, now, uris).on(side, shown.findings()))
        .orElse(List.of());
  }

  /** All that is known of the current texts; empty while there is no result for them. */
  Optional<Settled> known() {
    return result.map(now -> new Settled(files, now, editedAt));
  }
}
