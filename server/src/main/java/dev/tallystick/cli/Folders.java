package dev.tallystick.cli;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Folder;
import dev.tallystick.engine.Intake;
import dev.tallystick.engine.Listing;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.pairing.Pair;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import dev.tallystick.project.Names;
import dev.tallystick.project.Project;
import dev.tallystick.project.ProjectFile;
import dev.tallystick.text.Decoded;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The files in some folders, and what belongs together among them. A folder with a {@code
 * tallystick.json} is paired by itself and by what that says; all others are paired together. What
 * cannot be read, or is wrong in a {@code tallystick.json}, is told on the error console.
 */
final class Folders {
  private final Console console;
  private final Rules options;
  private final List<Path> all = new ArrayList<>();
  private final Map<Pair, Project> projects = new HashMap<>();
  private final Map<Pair, NamedRules> rules = new HashMap<>();
  private Pairs pairs = Pairs.NONE;
  private boolean complete = true;

  private Folders(Console console, Rules options) {
    this.console = console;
    this.options = options;
  }

  /**
   * Looks into folders.
   *
   * @param options what the command line says, which beats the projects
   * @throws Refused if one cannot be listed
   */
  static Folders of(Console console, List<Path> folders, Rules options) {
    Folders found = new Folders(console, options);
    folders.forEach(found::list);
    found.pair(folders);
    return found;
  }

  Pairs pairs() {
    return pairs;
  }

  /** The projects of the pairs that are in one. */
  Map<Pair, Project> projects() {
    return projects;
  }

  /** The rules for sentence borders in the pairs of a project. */
  Map<Pair, NamedRules> rules() {
    return rules;
  }

  /** All files, by the names that they have in the pairs. */
  Listing files() {
    return Listing.of(all, Path::normalize);
  }

  /** Whether all could be looked into, and nothing is wrong in a project. */
  boolean complete() {
    return complete;
  }

  private void list(Path folder) {
    List<String> unread = new ArrayList<>();
    try {
      all.addAll(Disk.REAL.files(new Folder(folder, Folder.DEEP), unread::add));
    } catch (Unreadable e) {
      throw new Refused(e.getMessage());
    }
    unread.forEach(console.err()::println);
    complete &= unread.isEmpty();
  }

  private void pair(List<Path> folders) {
    Map<Path, List<Path>> inProjects = new LinkedHashMap<>();
    List<Path> named =
        all.stream().filter(file -> Names.isRules(String.valueOf(file.getFileName()))).toList();
    all.removeAll(named);
    for (Path folder : folders) {
      if (all.removeIf(folder.resolve(ProjectFile.NAME)::equals)) {
        inProjects.put(folder, new ArrayList<>());
      }
    }
    List<Path> others = new ArrayList<>();
    for (Path file : all) {
      innermost(file, inProjects.keySet()).map(inProjects::get).orElse(others).add(file);
    }
    inProjects.forEach((folder, files) -> pairProject(folder, files, named));
    Listing names = Listing.of(others, Path::normalize);
    pairs = pairs.and(Pairing.pairs(names.names(), options));
  }

  private static Optional<Path> innermost(Path file, Collection<Path> folders) {
    return folders.stream()
        .filter(folder -> plain(file).startsWith(plain(folder)))
        .max(Comparator.comparingInt(folder -> plain(folder).getNameCount()));
  }

  private static Path plain(Path path) {
    return path.toAbsolutePath().normalize();
  }

  /**
   * Pairs the files of a project.
   *
   * @param named the files of rules for sentence borders that there are
   */
  private void pairProject(Path folder, List<Path> files, List<Path> named) {
    Path file = folder.resolve(ProjectFile.NAME);
    Decoded decoded = load(file);
    ProjectFile read = decoded == null ? ProjectFile.NONE : read(file, decoded);
    Project project = read.project();
    NamedRules borders = rules(folder, named, read, decoded);
    Listing names = Listing.of(files, path -> plain(folder).relativize(plain(path)));
    Pairs found =
        Pairing.pairs(names.names(), project.rules(Rules.NONE).under(options))
            .renamed(name -> Listing.name(names.file(name).normalize()));
    found.pairs().forEach(pair -> projects.put(pair, project));
    found.pairs().forEach(pair -> rules.put(pair, borders));
    pairs = pairs.and(found);
  }

  private ProjectFile read(Path file, Decoded decoded) {
    ProjectFile read = ProjectFile.of(decoded.text());
    boolean malformed = Malformed.tell(console, name(file), decoded);
    malformed |= Malformed.tell(console, name(file), decoded.text(), read.problems());
    complete &= !malformed;
    return read;
  }

  /** The text of a file; null if it cannot be read. */
  private Decoded load(Path file) {
    try {
      return Intake.load(Disk.REAL, file);
    } catch (Unreadable e) {
      console.err().println(e.getMessage());
      complete = false;
      return null;
    }
  }

  private NamedRules rules(Path folder, List<Path> named, ProjectFile project, Decoded decoded) {
    Optional<Path> file = project.project().segmentation().map(folder::resolve);
    try {
      if (file.filter(named::contains).isPresent()) {
        NamedRules read = NamedRules.read(console, file.get());
        complete &= read.sound();
        return read;
      }
    } catch (Unreadable e) {
      console.err().println(e.getMessage());
    }
    if (file.isPresent()) {
      Path json = folder.resolve(ProjectFile.NAME);
      Malformed.tell(console, name(json), decoded.text(), project.withoutRules());
      complete = false;
    }
    return NamedRules.NONE;
  }

  private static String name(Path file) {
    return Listing.name(file.normalize());
  }
}
