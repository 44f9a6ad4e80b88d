package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.stream.Stream;

/**
 * What is kept of each pair that is wanted, in the order of the pairs, and which translations are
 * marked finished, which outlasts the pair.
 */
final class PairStates {
  private final Map<FilePair, PairState> states = new TreeMap<>();
  private final Map<Path, List<PairState>> byFile = new HashMap<>();
  private final Set<Path> finished = new TreeSet<>();
  private final List<Event.Marked> marks = new ArrayList<>();
  private List<FilePair> kept = List.of();

  /**
   * Keeps these pairs and no others.
   *
   * @param wanted sorted
   * @return whether they are others than before
   */
  boolean keep(List<FilePair> wanted) {
    if (wanted.equals(kept)) {
      return false;
    }
    kept = List.copyOf(wanted);
    Set<FilePair> gone = new TreeSet<>(states.keySet());
    wanted.forEach(gone::remove);
    gone.forEach(pair -> states.remove(pair).drop());
    wanted.forEach(pair -> states.computeIfAbsent(pair, PairState::new));
    byFile.clear();
    for (PairState state : states.values()) {
      for (Path file : List.of(state.files().source(), state.files().target())) {
        byFile.computeIfAbsent(file, path -> new ArrayList<>()).add(state);
      }
    }
    return true;
  }

  /** Files may have other texts: what holds for their pairs may be something else. */
  void stir(Collection<Path> files) {
    files.forEach(file -> of(file).forEach(PairState::stir));
  }

  /** Anything may have changed. */
  void stirAll() {
    states.values().forEach(PairState::stir);
  }

  /** All has been done that follows. */
  void calm() {
    states.values().forEach(PairState::calm);
  }

  /** The pairs for which something else may hold than in the last turn, in their order. */
  List<PairState> stirred() {
    return states.values().stream().filter(PairState::stirred).toList();
  }

  /**
   * Gives each stirred pair its current texts, and those that are new to a worker. Pairs without an
   * open side take turns: each waits until a worker is free, and its files are not even read
   * before.
   *
   * @param awaited pairs that take no turns, though they may not be open
   */
  void take(Library library, Workers workers, Set<FilePair> awaited) {
    int free = workers.aside() - (int) states.values().stream().filter(PairState::running).count();
    for (PairState pair : states.values()) {
      boolean now = free > 0 || awaited.contains(pair.files());
      if (!pair.stirred() && !(pair.waiting() && now)) {
        continue;
      }
      pair.stir();
      pair.at(library.levels(pair.files()));
      boolean open = library.shows(pair.files()) || awaited.contains(pair.files());
      if (open || free > 0 || library.knows(pair.files())) {
        Optional<Task> task = take(library, pair, open || free > 0);
        task.ifPresent(work -> workers.examine(work, open));
        free -= task.isPresent() ? 1 : 0;
      } else {
        pair.await();
      }
    }
  }

  private Optional<Task> take(Library library, PairState pair, boolean now) {
    FilePair files = pair.files();
    Optional<Sheet> source = library.sheet(files, OnSide.SOURCE);
    Optional<Sheet> target = library.sheet(files, OnSide.TARGET);
    boolean draft = !finished.contains(files.target());
    if (now || pair.current(source, target, draft)) {
      return pair.take(source, target, draft);
    }
    pair.await();
    return Optional.empty();
  }

  /** Decides what each stirred pair shows while the translator writes at a place. */
  void show(Optional<Caret.Edited> caret) {
    stirred().forEach(pair -> pair.show(caret));
  }

  /** A worker is done with one. */
  void finish(Event.Examined examined) {
    PairState state = states.get(examined.task().files());
    if (state != null) {
      state.finish(examined.task(), examined.result());
    }
  }

  /** A text was edited, in a turn of the loop. */
  void edited(Path file, long turn) {
    of(file).filter(pair -> pair.files().target().equals(file)).forEach(pair -> pair.edited(turn));
  }

  /** A translation, or all translations of a source, are finished, or drafts again. */
  void mark(Event.Marked marked) {
    marks.add(marked);
  }

  /**
   * Does what was said of files of which it is known by now what they are paired with.
   *
   * @param alone told of each that is in no pair
   */
  void applyMarks(Library library, Consumer<Path> alone) {
    for (Event.Marked marked : List.copyOf(marks)) {
      if (library.listed(marked.file())) {
        marks.remove(marked);
        apply(marked, alone);
      }
    }
  }

  private void apply(Event.Marked marked, Consumer<Path> alone) {
    List<Path> targets = of(marked.file()).map(pair -> pair.files().target()).toList();
    if (targets.isEmpty()) {
      alone.accept(marked.file());
    } else if (marked.finished()) {
      finished.addAll(targets);
    } else {
      targets.forEach(finished::remove);
    }
  }

  /** Files have other names. */
  void rename(Renaming renaming) {
    List<Path> before = List.copyOf(finished);
    finished.clear();
    before.forEach(file -> finished.add(renaming.of(file)));
  }

  /** How many pairs that the editor does not show something is still to come for. */
  int unsettledAside(Library library) {
    return (int)
        states.values().stream()
            .filter(pair -> !pair.settled() && !library.shows(pair.files()))
            .count();
  }

  /** What is kept of each. */
  Collection<PairState> all() {
    return states.values();
  }

  /** The pairs. */
  Collection<FilePair> pairs() {
    return states.keySet();
  }

  /** The files of all pairs, sorted. */
  Set<Path> files() {
    return new TreeSet<>(byFile.keySet());
  }

  /** The pairs that a file is in. */
  Stream<PairState> of(Path file) {
    return byFile.getOrDefault(file, List.of()).stream();
  }

  /** The pairs that a question rests on. */
  Stream<PairState> of(Question question) {
    return question.pairs(states.keySet()).stream().map(states::get);
  }
}
