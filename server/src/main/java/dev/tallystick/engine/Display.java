package dev.tallystick.engine;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;

/** Brings what the editor shows of every file in line with what is known of it. */
final class Display {
  private final Library library;
  private final PairStates pairs;
  private final Bulletin bulletin;

  Display(Library library, PairStates pairs, Bulletin bulletin) {
    this.library = library;
    this.pairs = pairs;
    this.bulletin = bulletin;
  }

  /** Publishes what has changed in any files of which all is known. */
  void update() {
    Set<Path> files = pairs.files();
    files.addAll(bulletin.files());
    files.addAll(library.open());
    files.addAll(library.flawed());
    endless(pairs.all()).map(Endless::rules).forEach(files::add);
    bulletin.retain(files);
    update(files);
  }

  /** The same, where nothing else can have changed than these files and those of stirred pairs. */
  void updateOnly(Collection<Path> concerned) {
    Set<Path> files = new TreeSet<>(concerned);
    for (PairState pair : pairs.stirred()) {
      files.add(pair.files().source());
      files.add(pair.files().target());
    }
    bulletin.files().stream().filter(FolderRules::isRules).forEach(files::add);
    endless(pairs.stirred()).map(Endless::rules).forEach(files::add);
    update(files);
  }

  private void update(Set<Path> files) {
    for (Path file : files) {
      if (ready(file)) {
        publish(file);
      }
    }
  }

  private void publish(Path file) {
    Optional<Document> document = library.document(file);
    boolean due = document.filter(Document::due).isPresent();
    if (bulletin.rests(file, grounds(file, document)) && !due) {
      return;
    }
    List<Notice> notices = notices(file);
    if (document.isPresent()) {
      bulletin.publish(file, document.get(), notices);
    } else {
      Optional<Text> text = notices.isEmpty() ? Optional.empty() : library.text(file);
      bulletin.publish(file, text.orElse(new Text("")), notices);
    }
  }

  /** All that the notices of a file are made of: the same objects mean the same notices. */
  private List<Object> grounds(Path file, Optional<Document> document) {
    List<Object> grounds = new ArrayList<>(pairs.of(file).map(PairState::shown).toList());
    flaws(file).forEach(grounds::add);
    document.map(Document::text).ifPresent(grounds::add);
    if (document.isEmpty() && !grounds.isEmpty()) {
      grounds.add(library.problems(file));
    }
    return grounds;
  }

  private List<Notice> notices(Path file) {
    Stream<Notice> paired =
        pairs.of(file).flatMap(pair -> Stream.concat(findings(pair, file), faults(file)));
    return Stream.concat(paired, flaws(file).map(Notice::of)).sorted().distinct().toList();
  }

  private Stream<Problem> flaws(Path file) {
    Stream<Problem> inTexts =
        endless(pairs.all())
            .filter(found -> found.rules().equals(file))
            .map(Endless::problem)
            .distinct();
    return Stream.concat(
        library.flaws(file).stream(), FolderRules.isRules(file) ? inTexts : Stream.of());
  }

  /** A rule for sentence borders that did not come to an end over a text, and its file. */
  private record Endless(Path rules, Problem problem) {}

  private Stream<Endless> endless(Collection<PairState> in) {
    return in.stream()
        .flatMap(pair -> pair.known().stream())
        .flatMap(
            pair ->
                Stream.of(pair.files().source(), pair.files().target())
                    .flatMap(side -> endless(pair, side)));
  }

  private Stream<Endless> endless(Settled pair, Path side) {
    List<Problem> problems = pair.reading(side).endless();
    return problems.isEmpty()
        ? Stream.of()
        : library.rulesFor(side).stream()
            .flatMap(rules -> problems.stream().map(problem -> new Endless(rules, problem)));
  }

  private Stream<Notice> findings(PairState pair, Path file) {
    return pair.notices(pair.files().side(file), bulletin).stream();
  }

  private Stream<Notice> faults(Path file) {
    return library.problems(file).stream().map(Notice::of);
  }

  /** Whether all is known that there is to know of the current text of a file. */
  private boolean ready(Path file) {
    return library.listed(file) && pairs.of(file).allMatch(PairState::settled);
  }
}
