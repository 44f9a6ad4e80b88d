package dev.tallystick.engine;

import dev.tallystick.check.Levels;
import dev.tallystick.check.OnSide;
import dev.tallystick.check.Vigilance;
import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Language;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.OptionalLong;
import java.util.Set;
import java.util.stream.Stream;

/**
 * The files that matter: what stands in them, and which belong together. Keeps the folders that
 * count listed, and those that the editor does not watch watched.
 */
final class Library {
  private final Workspace workspace = new Workspace();
  private final Shelf shelf;
  private final Workers workers;
  private final Watch watch;
  private final boolean editorWatches;
  private Language assumed = Language.UNKNOWN;
  private Vigilance vigilance = Vigilance.BALANCED;

  Library(Shelf shelf, Workers workers, Watch watch, boolean editorWatches) {
    this.shelf = shelf;
    this.workers = workers;
    this.watch = watch;
    this.editorWatches = editorWatches;
  }

  /** The editor shows a file. One that was not listed may have come with others. */
  void open(Path file, Document document) {
    shelf.open(file, document);
    workspace
        .root(file)
        .filter(root -> root.folder().lists(file) && !root.awaited() && !root.has(file))
        .filter(root -> root.request(true))
        .ifPresent(this::list);
    foldersMoved();
  }

  /** The editor no longer shows a file. */
  void close(Path file) {
    shelf.close(file);
    foldersMoved();
  }

  /** The workspace has other folders. */
  void change(Event.FoldersChanged changed) {
    workspace.change(changed.added(), changed.removed());
    foldersMoved();
  }

  /** What the user has set counts from now on. */
  void rules(Settings settings) {
    assumed = settings.sourceLanguage().orElse(Language.UNKNOWN);
    workspace.rules(settings.rules());
    workspace.scope(settings.folders());
    vigilance = settings.vigilance();
  }

  /**
   * The user says that two files belong together.
   *
   * @return a file that cannot be read; then they do not
   */
  Optional<Path> pair(Event.Paired paired) {
    for (Path file : List.of(paired.source(), paired.target())) {
      if (shelf.text(file).isEmpty()) {
        return Optional.of(file);
      }
    }
    workspace.pair(paired);
    foldersMoved();
    return Optional.empty();
  }

  /** All pairs of a folder, or of all folders, are wanted from now on. */
  void want(Optional<Path> folder) {
    workspace.want(folder);
  }

  /** Only the open pairs are wanted from now on. */
  void decline() {
    workspace.decline();
  }

  /** Files or folders have other names. */
  void rename(Renaming renaming) {
    workspace.rename(renaming);
    List<Path> files = new ArrayList<>(renaming.names().keySet());
    files.addAll(renaming.names().values());
    reread(new Event.FilesChanged(files, true));
  }

  /**
   * A worker has listed a folder.
   *
   * @return what could not be looked into, as far as it was not told before
   */
  List<String> listed(Event.Listed listed) {
    List<String> news = workspace.news(listed.folder(), listed.troubles());
    workspace.listed(listed.folder(), listed.files()).ifPresent(this::list);
    return news;
  }

  /** Files were written: reads those that matter, and lists the folders that may have others. */
  void reread(Event.FilesChanged changed) {
    boolean any = changed.files().isEmpty();
    List<Path> files = any ? shelf.disk().files() : changed.files();
    files.forEach(shelf.disk()::changed);
    for (Root root : changed.listing() ? workspace.roots() : List.<Root>of()) {
      boolean concerned = any || files.stream().anyMatch(root.folder()::reaches);
      if (concerned && root.request(false)) {
        list(root);
      }
    }
  }

  /** Time has passed. */
  void settle(long restMillis) {
    shelf.disk().settle(restMillis);
  }

  /** When a file that may be half written will have been stable for a rest; empty without any. */
  OptionalLong due(long restMillis) {
    return shelf.disk().due(restMillis);
  }

  /** Folders count that did not, perhaps, or no longer do. */
  private void foldersMoved() {
    workspace.open(shelf.open());
    for (Root root : workspace.roots()) {
      if (root.begin()) {
        list(root);
      }
    }
    List<Root> unseen = editorWatches ? workspace.ownRoots() : workspace.roots();
    watch.over(unseen.stream().map(Root::folder).toList());
  }

  private void list(Root root) {
    workers.list(root.folder());
  }

  /** Whether it is known which files could belong to a file. */
  boolean listed(Path file) {
    return workspace.root(file).filter(Root::awaited).isEmpty();
  }

  /** Whether it is known which files there are in all folders that wanted pairs may be in. */
  boolean complete() {
    return workspace.complete();
  }

  /** Whether the editor shows a side of a pair. */
  boolean shows(FilePair pair) {
    return shelf.open().contains(pair.source()) || shelf.open().contains(pair.target());
  }

  /** Whether both texts of a pair are at hand, so that the disk need not be asked. */
  boolean knows(FilePair pair) {
    return shelf.knows(pair.source()) && shelf.knows(pair.target());
  }

  /** The pairs that are wanted, sorted: those with an open side, or all in some folders. */
  List<FilePair> pairs() {
    workspace.readProjects(shelf);
    return workspace.pairs();
  }

  /** How loudly findings in a pair are said. */
  Levels levels(FilePair pair) {
    return workspace.levels(pair).at(vigilance);
  }

  /** What the user has to be asked about the open files, and has not been. */
  List<Ambiguity> questions() {
    return workspace.questions();
  }

  /** The files that the editor shows, sorted. */
  Set<Path> open() {
    return shelf.open();
  }

  /** Whether the editor shows a file, and nothing but its own pairs rests on its text. */
  boolean isText(Path file) {
    return shelf.document(file).isPresent()
        && projects().noneMatch(project -> project.files().contains(file));
  }

  /** What is known of a file that the editor shows. */
  Optional<Document> document(Path file) {
    return shelf.document(file);
  }

  /** The editor's number for the text of a file; empty if it does not show the file. */
  OptionalInt version(Path file) {
    return shelf
        .document(file)
        .map(Document::version)
        .map(OptionalInt::of)
        .orElse(OptionalInt.empty());
  }

  /** The text of a file; empty if it cannot be read or is lost. */
  Optional<Text> text(Path file) {
    return shelf.text(file);
  }

  /** What is wrong with the bytes of a file that the editor does not show. */
  List<Problem> problems(Path file) {
    return shelf.problems(file);
  }

  /** What is wrong in a file that settles what holds in a folder; nothing in any other. */
  List<Problem> flaws(Path file) {
    return projects().flatMap(project -> project.flaws(file, shelf).stream()).toList();
  }

  /** The files that something is wrong in that {@link #flaws} tells. */
  List<Path> flawed() {
    return projects()
        .flatMap(project -> project.files().stream())
        .filter(file -> !flaws(file).isEmpty())
        .toList();
  }

  private Stream<FolderProject> projects() {
    return workspace.roots().stream().map(Root::project);
  }

  /**
   * The sheet of the current text on a side of a pair; the same one as long as the text and the
   * rules stay the same.
   */
  Optional<Sheet> sheet(FilePair pair, OnSide side) {
    Path file = pair.file(side);
    Language otherwise = side == OnSide.SOURCE ? assumed : Language.UNKNOWN;
    TextRules rules = project(file).map(FolderProject::texts).orElse(TextRules.USUAL);
    return shelf.sheet(file, new Tongue(pair.language(side), otherwise), rules);
  }

  /** The file with the rules for sentence borders that hold for a file. */
  Optional<Path> rulesFor(Path file) {
    return project(file).map(FolderProject::rules).flatMap(FolderRules::file);
  }

  private Optional<FolderProject> project(Path file) {
    return workspace.root(file).map(Root::project);
  }

  /** Forgets what is known of all files but these, and those that settle what holds. */
  void retain(Collection<Path> files) {
    Set<Path> kept = new HashSet<>(files);
    projects().map(FolderProject::files).forEach(kept::addAll);
    shelf.retain(kept);
  }
}
