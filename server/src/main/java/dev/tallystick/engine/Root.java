package dev.tallystick.engine;

import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import java.nio.file.Path;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import java.util.function.Supplier;

/** A folder within which files are paired, and what was last found in it. */
final class Root {
  private final Folder folder;
  private final FolderProject project;
  private List<Path> files = List.of();
  private Set<String> told = Set.of();
  private Listing listed = Listing.of(List.of(), file -> file);
  private Pairs pairs = Pairing.pairs(Set.of(), Rules.NONE);
  private Set<Path> paired = Set.of();
  private Rules by = Rules.NONE;
  private boolean current;
  private boolean listing;
  private boolean again;
  private boolean awaited = true;
  private boolean asked;

  Root(Folder folder) {
    this.folder = folder;
    this.project = new FolderProject(folder.path());
  }

  Folder folder() {
    return folder;
  }

  /** What is settled for the files in it. */
  FolderProject project() {
    return project;
  }

  List<Path> files() {
    return files;
  }

  /** Whether a file is one of those that were found when the folder was listed last. */
  boolean has(Path file) {
    return files.contains(file) || project.onDisk() && project.file().equals(file);
  }

  /** Whether it is not known yet which files there are, so that nothing can be said of them. */
  boolean awaited() {
    return awaited;
  }

  /**
   * Files may have appeared or vanished.
   *
   * @param urgent whether nothing can be said before they are known
   * @return whether the folder is to be listed now; if it is being listed, that comes after
   */
  boolean request(boolean urgent) {
    awaited |= urgent;
    again = listing;
    boolean now = !listing;
    listing = true;
    return now;
  }

  /** Whether the folder is to be listed now as nothing is known of its files yet. */
  boolean begin() {
    return awaited && !listing && request(true);
  }

  /**
   * Takes a list of the files.
   *
   * @return whether the folder is to be listed once more
   */
  boolean listed(List<Path> found) {
    project.listed(found);
    files = found.stream().filter(file -> !file.equals(project.file())).toList();
    forget();
    listing = again;
    again = false;
    awaited &= listing;
    return listing;
  }

  /** Of what could not be looked into, what is new since the folder was listed last. */
  List<String> news(List<String> troubles) {
    List<String> news = troubles.stream().filter(trouble -> !told.contains(trouble)).toList();
    told = Set.copyOf(troubles);
    return news;
  }

  /** The files or the rules may have changed: if so, they are to be paired anew. */
  void forget() {
    current = false;
  }

  /**
   * What belongs together among some files of this folder.
   *
   * @param set what the user has set, which the project beats
   */
  Pairs pairs(Supplier<Set<Path>> among, Rules set) {
    if (!current) {
      pair(among.get(), project.project().rules(set));
      current = true;
    }
    return pairs;
  }

  private void pair(Set<Path> among, Rules rules) {
    if (!among.equals(paired) || !rules.equals(by)) {
      listed = Listing.of(among, folder.path()::relativize);
      pairs = Pairing.pairs(listed.names(), rules);
      paired = among;
      by = rules;
    }
  }

  /** The pairs that are wanted, with their files as absolute paths. */
  List<FilePair> absolute(Pairs found, Predicate<FilePair> wanted) {
    return found.pairs().stream().map(pair -> FilePair.of(listed, pair)).filter(wanted).toList();
  }

  /** The first open question about one of these files, unless something was asked before. */
  Optional<Ambiguity> question(Pairs found, Collection<Path> open) {
    if (asked || found.ambiguities().isEmpty()) {
      return Optional.empty();
    }
    Set<String> paths = new HashSet<>();
    open.stream()
        .filter(file -> file.startsWith(folder.path()))
        .forEach(file -> paths.add(Listing.name(folder.path().relativize(file))));
    Optional<Ambiguity> question =
        found.ambiguities().stream()
            .filter(ambiguity -> ambiguity.files().stream().anyMatch(paths::contains))
            .findFirst();
    asked = question.isPresent();
    return question;
  }
}
