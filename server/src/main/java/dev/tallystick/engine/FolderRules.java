package dev.tallystick.engine;

import dev.tallystick.project.Names;
import dev.tallystick.segment.Srx;
import dev.tallystick.segment.SrxFile;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The rules for sentence borders that a project names, kept in step with the text of their file. A
 * file that is not in the folder, or only by a link that leads out of it, is not read.
 */
final class FolderRules {
  private static final SrxFile NOTHING = new SrxFile(Srx.NONE, List.of());

  private final Path folder;
  private List<Path> listed = List.of();
  private Optional<Path> file = Optional.empty();
  private Optional<Text> text = Optional.empty();
  private SrxFile read = NOTHING;

  FolderRules(Path folder) {
    this.folder = folder;
  }

  /** The folder was listed. */
  void listed(List<Path> files) {
    listed = files.stream().filter(FolderRules::isRules).toList();
  }

  /** Whether a file has rules, by its name. */
  static boolean isRules(Path file) {
    return Names.isRules(String.valueOf(file.getFileName()));
  }

  /** Whether the disk has a file of rules, as far as it is known. */
  boolean onDisk(Path of) {
    return listed.contains(of);
  }

  /** Reads the file if its name or text is new. */
  void take(Optional<String> name, Shelf shelf) {
    file = name.map(folder::resolve);
    boolean there =
        file.filter(path -> onDisk(path) || shelf.document(path).isPresent()).isPresent();
    Optional<Text> now = there ? shelf.text(file.get()) : Optional.empty();
    if (!now.equals(text)) {
      text = now;
      read = now.map(SrxFile::of).orElse(NOTHING);
    }
  }

  /** The file, if one is named. */
  Optional<Path> file() {
    return file;
  }

  /** Whether one is named and cannot be read. */
  boolean missing() {
    return file.isPresent() && text.isEmpty();
  }

  /** What it says; the same as long as its text stays the same. */
  Srx srx() {
    return read.rules();
  }

  /** What is wrong in it, or with its bytes. */
  List<Problem> problems(Shelf shelf) {
    List<Problem> problems = new ArrayList<>();
    if (text.isPresent()) {
      problems.addAll(shelf.problems(file.get()));
      problems.addAll(read.problems());
    }
    return problems;
  }
}
