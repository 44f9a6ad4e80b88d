package dev.tallystick.engine;

import dev.tallystick.project.Project;
import dev.tallystick.project.ProjectFile;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The {@code tallystick.json} of a folder, kept in step with its text: the editor's if it shows the
 * file, else the disk's. While that text is not to be had, what it said last counts.
 */
final class FolderProject {
  private final Path file;
  private boolean onDisk;
  private Optional<Text> text = Optional.empty();
  private ProjectFile read = ProjectFile.NONE;
  private final FolderRules rules;

  /** The one of a folder. */
  FolderProject(Path folder) {
    file = folder.resolve(ProjectFile.NAME);
    rules = new FolderRules(folder);
  }

  Path file() {
    return file;
  }

  /** Whether the disk has such a file, as far as it is known. */
  boolean onDisk() {
    return onDisk;
  }

  /** The folder was listed. */
  void listed(List<Path> files) {
    onDisk = files.contains(file);
    rules.listed(files);
  }

  /** Reads the file if its text is new; whether the project is another one now. */
  boolean take(Shelf shelf) {
    boolean other = takeProject(shelf);
    rules.take(read.project().segmentation(), shelf);
    return other;
  }

  private boolean takeProject(Shelf shelf) {
    boolean there = onDisk || shelf.document(file).isPresent();
    Optional<Text> now = there ? shelf.text(file) : Optional.empty();
    if (there && now.isEmpty() || now.equals(text)) {
      return false;
    }
    Project before = read.project();
    text = now;
    read = now.map(ProjectFile::of).orElse(ProjectFile.NONE);
    return !read.project().equals(before);
  }

  /** What the file says. */
  Project project() {
    return read.project();
  }

  /** How its texts are read. */
  TextRules texts() {
    return new TextRules(rules.srx(), read.project().frontMatter());
  }

  /** The rules for sentence borders. */
  FolderRules rules() {
    return rules;
  }

  /** The files that settle what holds: this one and that of the rules. */
  List<Path> files() {
    List<Path> files = new ArrayList<>(List.of(file));
    rules.file().ifPresent(files::add);
    return files;
  }

  /** What is wrong in one of these files; nothing in any other. */
  List<Problem> flaws(Path of, Shelf shelf) {
    if (of.equals(file)) {
      return problems(shelf);
    }
    return rules.file().filter(of::equals).isPresent() ? rules.problems(shelf) : List.of();
  }

  /** What is wrong in it, or with its bytes, or that it cannot be read at all. */
  private List<Problem> problems(Shelf shelf) {
    if (!onDisk && shelf.document(file).isEmpty()) {
      return List.of();
    }
    List<Problem> problems = new ArrayList<>(shelf.problems(file));
    if (shelf.text(file).isPresent()) {
      problems.addAll(read.problems());
      problems.addAll(rules.missing() ? read.withoutRules() : List.of());
    } else {
      shelf.trouble(file).ifPresent(why -> problems.add(new Problem(new Span(0, 0), why)));
    }
    return problems;
  }
}
