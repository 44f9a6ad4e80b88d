package dev.tallystick.engine;

import dev.tallystick.align.Judgement;
import dev.tallystick.check.Finding;
import dev.tallystick.check.Levels;
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

  /** The same texts, being learnt from while what was found in them is shown already. */
  private Optional<Task> learning = Optional.empty();

  private Optional<Judgement> known = Optional.empty();
  private boolean running;
  private boolean waiting;
  private boolean stirred = true;
  private Optional<PairResult> found = Optional.empty();
  private Optional<PairResult> result = Optional.empty();
  private Levels levels = Levels.USUAL;
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
    return !running && !waiting;
  }

  /** Whether a worker has it. */
  boolean running() {
    return running;
  }

  /** Its texts may be others by now, but its turn has not come. */
  void await() {
    waiting = true;
  }

  boolean waiting() {
    return waiting;
  }

  /** What holds for it may be something else than in the last turn. */
  void stir() {
    stirred = true;
  }

  boolean stirred() {
    return stirred;
  }

  /** All has been done that follows. */
  void calm() {
    stirred = false;
  }

  /** Whether all is as it was when the texts were taken. */
  boolean current(Optional<Sheet> source, Optional<Sheet> target, boolean draft) {
    if (source.isEmpty() || target.isEmpty()) {
      return task == null;
    }
    return task != null && task.isAbout(source.get(), target.get(), draft);
  }

  /**
   * Takes the current texts; whatever was found in others, or is being looked for, is dropped.
   *
   * @param draft whether the translation is still being written
   * @param edited whether somebody writes in it, so that a quick answer is wanted
   * @return work to be done, if the texts are new and both there
   */
  Optional<Task> take(
      Optional<Sheet> source, Optional<Sheet> target, boolean draft, boolean edited) {
    waiting = false;
    if (current(source, target, draft)) {
      return Optional.empty();
    }
    drop();
    if (source.isEmpty() || target.isEmpty()) {
      return Optional.empty();
    }
    Optional<Judgement> basis = edited ? known : Optional.empty();
    task = new Task(files, source.get(), target.get(), draft, basis);
    running = true;
    return Optional.of(task);
  }

  /**
   * Nobody writes in it any more: what was judged by what an earlier state has taught is to be
   * judged by what this one teaches.
   *
   * @return that work, if it has not been begun
   */
  Optional<Task> rest() {
    boolean due =
        !running && learning.isEmpty() && found.filter(PairResult::provisional).isPresent();
    if (due) {
      learning = Optional.of(task.learning());
    }
    return due ? learning : Optional.empty();
  }

  /** Nobody can write in it: what later states would be judged by is forgotten. */
  void forget() {
    known = Optional.empty();
    if (found.filter(one -> one.judgement().isPresent() && !one.provisional()).isPresent()) {
      take(found.map(PairResult::last));
    }
  }

  /** The pair is no longer wanted, or its texts are no longer these. */
  void drop() {
    if (task != null) {
      task.drop();
    }
    learning.ifPresent(Task::drop);
    learning = Optional.empty();
    task = null;
    running = false;
    take(Optional.empty());
  }

  /** Takes a worker's result, unless the texts have moved on. */
  void finish(Task done, Optional<PairResult> now) {
    if (task == done) {
      running = false;
      stir();
      take(now);
    } else if (learning.filter(one -> one == done).isPresent() && now.isPresent()) {
      stir();
      take(now);
    }
  }

  /** The project wants findings told so loudly. */
  void at(Levels now) {
    if (!now.equals(levels)) {
      levels = now;
      take(found);
    }
  }

  private void take(Optional<PairResult> now) {
    found = now;
    result = now.map(one -> one.at(levels));
    known = now.flatMap(PairResult::judgement).or(() -> known);
  }

  /** The pair's translation was edited; the turn tells which pair was edited last. */
  void edited(long turn) {
    editedAt = turn;
  }

  /** Decides what is to be shown: all findings but those about what is being written. */
  void show(Optional<Caret.Edited> caret) {
    if (!settled()) {
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
    if (!shown.is(findings, now)) {
      shown = new HeldBack.Shown(findings, now);
    }
  }

  private List<Finding> withoutHeld(PairResult now, Caret.Edited edited) {
    HeldBack held = new HeldBack(now, files.side(edited.file()), edited.offset());
    return now.findings().stream().filter(finding -> !held.holds(finding, shown)).toList();
  }

  /** The findings that are shown: the same object for as long as nothing about them changes. */
  HeldBack.Shown shown() {
    return shown;
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
