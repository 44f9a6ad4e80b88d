package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.stream.Stream;

/** What is kept of each pair that is wanted, in the order of the pairs. */
final class PairStates {
  private final Map<FilePair, PairState> states = new TreeMap<>();

  /**
   * Keeps these pairs and no others.
   *
   * @param wanted sorted
   * @return whether they are others than before
   */
  boolean keep(List<FilePair> wanted) {
    if (wanted.equals(List.copyOf(states.keySet()))) {
      return false;
    }
    Set<FilePair> gone = new TreeSet<>(states.keySet());
    wanted.forEach(gone::remove);
    gone.forEach(pair -> states.remove(pair).drop());
    wanted.forEach(pair -> states.computeIfAbsent(pair, PairState::new));
    return true;
  }

  /** Gives each pair its current texts, and those that are new to a worker. */
  void take(Library library, Consumer<Task> work) {
    for (PairState pair : states.values()) {
      pair.take(sheet(library, pair, OnSide.SOURCE), sheet(library, pair, OnSide.TARGET))
          .ifPresent(work);
    }
  }

  private static Optional<Sheet> sheet(Library library, PairState pair, OnSide side) {
    return library.sheet(pair.files().file(side), pair.files().language(side).tag());
  }

  /** Decides what each pair shows while the translator writes at a place. */
  void show(Optional<Caret.Edited> caret) {
    states.values().forEach(pair -> pair.show(caret));
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

  /** The pairs. */
  Collection<FilePair> pairs() {
    return states.keySet();
  }

  /** What is kept of each. */
  Collection<PairState> all() {
    return states.values();
  }

  /** The files of all pairs, sorted. */
  Set<Path> files() {
    Set<Path> files = new TreeSet<>();
    for (FilePair pair : states.keySet()) {
      files.add(pair.source());
      files.add(pair.target());
    }
    return files;
  }

  /** The pairs that a file is in. */
  Stream<PairState> of(Path file) {
    return states.values().stream().filter(pair -> pair.files().has(file));
  }

  /** The pairs that a question rests on. */
  Stream<PairState> of(Question question) {
    return question.pairs(states.keySet()).stream().map(states::get);
  }
}
