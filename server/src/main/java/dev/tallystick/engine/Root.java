package dev.tallystick.engine;

import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.function.Supplier;

/** A folder within which files are paired, and what was last found in it. */
final class Root {
  private final Folder folder;
  private List<Path> files = List.of();
  private Listing listed = Listing.of(List.of(), file -> file);
  private Optional<Pairs> pairs = Optional.empty();
  private boolean listing;
  private boolean again;
  private boolean awaited = true;
  private boolean asked;

  Root(Folder folder) {
    this.folder = folder;
  }

  Folder folder() {
    return folder;
  }

  List<Path> files() {
    return files;
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

  /**
   * Takes a list of the files.
   *
   * @return whether the folder is to be listed once more
   */
  boolean listed(List<Path> found) {
    files = List.copyOf(found);
    pairs = Optional.empty();
    listing = again;
    again = false;
    awaited &= listing;
    return listing;
  }

  /** The files or the rules have changed: they are to be paired anew. */
  void forget() {
    pairs = Optional.empty();
  }

  /** What belongs together among some files of this folder. */
  Pairs pairs(Supplier<List<Path>> among, Rules rules) {
    if (pairs.isEmpty()) {
      listed = Listing.of(among.get(), folder.path()::relativize);
      pairs = Optional.of(Pairing.pairs(listed.names(), rules));
    }
    return pairs.get();
  }

  /** The pairs that are wanted, with their files as absolute paths. */
  List<FilePair> absolute(Pairs found, Predicate<FilePair> wanted) {
    return found.pairs().stream().map(pair -> FilePair.of(listed, pair)).filter(wanted).toList();
  }

  /** The first open question about one of these files, unless something was asked before. */
  Optional<Ambiguity> question(Pairs found, Collection<Path> open) {
    List<String> paths = new ArrayList<>();
    open.stream()
        .filter(file -> file.startsWith(folder.path()))
        .forEach(file -> paths.add(Listing.name(folder.path().relativize(file))));
    Optional<Ambiguity> question =
        found.ambiguities().stream()
            .filter(ambiguity -> ambiguity.files().stream().anyMatch(paths::contains))
            .filter(ambiguity -> !asked)
            .findFirst();
    asked |= question.isPresent();
    return question;
  }
}
