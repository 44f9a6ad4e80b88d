package dev.tallystick.engine;

import dev.tallystick.check.Levels;
import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import dev.tallystick.prose.Format;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Which files belong together. The folders that the editor names count with all that is in them; a
 * file outside of them makes its own folder count, but only the upper levels, for it may be
 * someone's home. A file belongs to one folder only: the innermost that the editor named, else the
 * outermost of the others.
 */
final class Workspace {
  /** Levels that count in the folder of a file outside of the editor's folders. */
  private static final int SHALLOW = 2;

  private final Map<Path, Root> named = new TreeMap<>();
  private final Map<Path, Root> own = new TreeMap<>();
  private final MadePairs made = new MadePairs();
  private final Scope scope = new Scope();
  private Rules rules = Rules.NONE;
  private boolean usual = true;

  private final Set<Path> open = new TreeSet<>();
  private Optional<List<FilePair>> pairs = Optional.empty();

  void rules(Rules now) {
    rules = now;
    roots().forEach(Root::forget);
    pairs = Optional.empty();
  }

  /** The setting: whether all pairs of the editor's folders are wanted. */
  void scope(boolean folders) {
    scope.set(folders);
    pairs = Optional.empty();
  }

  /** All pairs of a folder, or of all folders, are wanted, whatever the setting. */
  void want(Optional<Path> folder) {
    scope.want(
        roots().stream()
            .map(root -> root.folder().path())
            .filter(path -> folder.isEmpty() || meet(folder.get(), path))
            .toList());
    pairs = Optional.empty();
  }

  private static boolean meet(Path one, Path other) {
    return one.startsWith(other) || other.startsWith(one);
  }

  /** Only the open pairs are wanted from now on. */
  void decline() {
    scope.decline();
    pairs = Optional.empty();
  }

  /** The user says that two files belong together. */
  void pair(Event.Paired paired) {
    made.add(paired);
    pairs = Optional.empty();
  }

  /** Files have other names. */
  void rename(Renaming renaming) {
    made.rename(renaming);
    pairs = Optional.empty();
  }

  /** The editor names other folders. */
  void change(List<Path> added, List<Path> removed) {
    removed.forEach(named::remove);
    added.forEach(path -> named.computeIfAbsent(path, p -> new Root(new Folder(p, Folder.DEEP))));
    open(Set.copyOf(open));
  }

  /** Other files are open than before: their folders count, and those of no open file do not. */
  void open(Collection<Path> files) {
    open.clear();
    open.addAll(files);
    made.retainBuffers(open);
    Set<Path> concerned = new TreeSet<>(open);
    made.all().stream()
        .filter(this::hasOpenSide)
        .forEach(pair -> concerned.addAll(List.of(pair.source(), pair.target())));
    for (Path file : concerned) {
      if (root(file).isEmpty() && file.getParent() != null) {
        own.put(file.getParent(), new Root(new Folder(file.getParent(), SHALLOW)));
      }
    }
    Set<Path> used = new HashSet<>();
    concerned.forEach(file -> root(file).ifPresent(root -> used.add(root.folder().path())));
    own.keySet().retainAll(used);
    roots().forEach(Root::forget);
    pairs = Optional.empty();
  }

  /**
   * Takes a list of the files in a folder.
   *
   * @return the folder, if it is to be listed once more
   */
  Optional<Root> listed(Path folder, List<Path> files) {
    pairs = Optional.empty();
    return Optional.ofNullable(named.getOrDefault(folder, own.get(folder)))
        .filter(root -> root.listed(files));
  }

  /** Of what could not be looked into in a folder, what was not told before. */
  List<String> news(Path folder, List<String> troubles) {
    Root root = named.getOrDefault(folder, own.get(folder));
    return root == null ? List.of() : root.news(troubles);
  }

  /** Reads the {@code tallystick.json} of each folder, where its text is new. */
  void readProjects(Shelf shelf) {
    usual = true;
    for (Root root : roots()) {
      if (root.project().take(shelf)) {
        root.forget();
        pairs = Optional.empty();
      }
      usual &= levels(root).equals(Levels.USUAL);
    }
  }

  /** How loudly findings in a pair are said. */
  Levels levels(FilePair pair) {
    return usual ? Levels.USUAL : root(pair.source()).map(Workspace::levels).orElse(Levels.USUAL);
  }

  private static Levels levels(Root root) {
    return root.project().project().levels();
  }

  /** All folders that count. */
  List<Root> roots() {
    List<Root> roots = new ArrayList<>(named.values());
    roots.addAll(own.values());
    return roots;
  }

  /** Those of them that the editor does not know of. */
  List<Root> ownRoots() {
    return List.copyOf(own.values());
  }

  /** The folder that a file belongs to. */
  Optional<Root> root(Path file) {
    Optional<Root> found = Optional.empty();
    for (Root root : named.values()) { // sorted: an inner one comes later
      found = root.folder().holds(file) ? Optional.of(root) : found;
    }
    return found.isPresent()
        ? found
        : own.values().stream().filter(root -> root.folder().holds(file)).findFirst();
  }

  /** The pairs that are wanted, sorted: those with an open side, or all in some folders. */
  List<FilePair> pairs() {
    if (pairs.isEmpty()) {
      Set<FilePair> wanted = new TreeSet<>();
      made.all().stream()
          .filter(pair -> hasOpenSide(pair) || root(pair.target()).filter(this::whole).isPresent())
          .forEach(wanted::add);
      for (Root root : concerned()) {
        boolean whole = whole(root);
        wanted.addAll(
            root.absolute(
                found(root), pair -> (whole || hasOpenSide(pair)) && !made.overrule(pair)));
      }
      pairs = Optional.of(List.copyOf(wanted));
    }
    return pairs.get();
  }

  private boolean hasOpenSide(FilePair pair) {
    return open.contains(pair.source()) || open.contains(pair.target());
  }

  private boolean whole(Root root) {
    Path path = root.folder().path();
    return scope.whole(path, named.containsKey(path));
  }

  /** What the user has to be asked about the files of wanted pairs, and has not been. */
  List<Ambiguity> questions() {
    List<Ambiguity> questions = new ArrayList<>();
    for (Root root : concerned()) {
      if (!root.awaited()) {
        Collection<Path> about = whole(root) ? root.files() : open;
        root.question(found(root), about).ifPresent(questions::add);
      }
    }
    return questions;
  }

  /** The folders that wanted pairs may be in. */
  private Set<Root> concerned() {
    Set<Root> roots = new LinkedHashSet<>();
    open.forEach(file -> root(file).ifPresent(roots::add));
    roots().stream().filter(this::whole).forEach(roots::add);
    return roots;
  }

  /** Whether it is known which files there are in all folders that wanted pairs may be in. */
  boolean complete() {
    return concerned().stream().noneMatch(Root::awaited);
  }

  private Pairs found(Root root) {
    return root.pairs(() -> files(root), rules);
  }

  /** The files that belong to a folder: those on the disk, and those only in the editor so far. */
  private Set<Path> files(Root root) {
    Set<Path> files = new LinkedHashSet<>(root.files());
    for (Path file : open) {
      if (Format.ofName(file.getFileName().toString()).isPresent()) {
        files.add(file);
      }
    }
    files.removeIf(file -> root(file).filter(root::equals).isEmpty());
    return files;
  }
}
