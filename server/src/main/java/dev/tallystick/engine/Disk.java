package dev.tallystick.engine;

import dev.tallystick.project.ProjectFile;
import dev.tallystick.prose.Format;
import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;

/** The files of this machine, as far as the engine reads them. It never writes any. */
public interface Disk {
  /** This machine's own. */
  Disk REAL = new RealDisk();

  /**
   * The bytes of a file.
   *
   * @throws Unreadable with a message for the translator if there is no such file, or no reading it
   */
  byte[] read(Path file) throws Unreadable;

  /**
   * The files in a folder, however deep, whose names have the extension of a format, and right in
   * it its {@code tallystick.json}; also files of rules for sentence borders. Hidden files and
   * folders are passed over, and links that lead out of the folder. Sorted.
   *
   * @throws Unreadable if the folder cannot be listed
   */
  List<Path> files(Path folder) throws Unreadable;

  /**
   * The same, of a folder or its upper part, with a message for each folder or file on the way that
   * cannot be looked into.
   *
   * @throws Unreadable if the folder itself cannot be listed
   */
  default List<Path> files(Folder folder, Consumer<String> unread) throws Unreadable {
    return files(folder.path()).stream().filter(folder::holds).toList();
  }

  /** The disk of this machine. */
  final class RealDisk implements Disk {
    private RealDisk() {}

    @Override
    public byte[] read(Path file) throws Unreadable {
      if (!Files.exists(file)) {
        throw new Unreadable(file + ": there is no such file. Check the name and the folder.");
      }
      if (Files.isDirectory(file)) {
        throw new Unreadable(file + ": this is a folder, not a file. Name a file in it.");
      }
      if (!Files.isRegularFile(file)) {
        throw new Unreadable(file + ": this is no file with a text in it. Name one that is.");
      }
      try {
        return Files.readAllBytes(file);
      } catch (IOException | OutOfMemoryError e) {
        throw new Unreadable(
            file + ": cannot be read (" + e.getMessage() + "). Check who may read it.");
      }
    }

    @Override
    public List<Path> files(Path folder) throws Unreadable {
      return files(new Folder(folder, Folder.DEEP), message -> {});
    }

    @Override
    public List<Path> files(Folder folder, Consumer<String> unread) throws Unreadable {
      List<Path> found = new ArrayList<>();
      Path path = folder.path();
      try {
        Collector collector = new Collector(path, path.toRealPath(), found, unread);
        Files.walkFileTree(path, Set.of(), folder.depth(), collector);
      } catch (IOException e) {
        throw new Unreadable(path + ": cannot be listed (" + e.getMessage() + ").");
      }
      Collections.sort(found);
      return found;
    }
  }

  /** Collects files of known formats, and the facts of the project. */
  final class Collector extends SimpleFileVisitor<Path> {
    private final Path folder;
    private final Path root;
    private final List<Path> found;
    private final Consumer<String> unread;

    private Collector(Path folder, Path root, List<Path> found, Consumer<String> unread) {
      this.folder = folder;
      this.root = root;
      this.found = found;
      this.unread = unread;
    }

    @Override
    public FileVisitResult preVisitDirectory(Path visited, BasicFileAttributes attributes) {
      boolean hidden = !visited.equals(folder) && Folder.hides(visited);
      return hidden ? FileVisitResult.SKIP_SUBTREE : FileVisitResult.CONTINUE;
    }

    @Override
    public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
      boolean prose = Format.ofName(file.getFileName().toString()).isPresent();
      boolean settles = file.equals(folder.resolve(ProjectFile.NAME)) || FolderRules.isRules(file);
      boolean ours = settles || prose;
      if (ours
          && !Folder.hides(file)
          && (attributes.isSymbolicLink() ? staysInside(file) : attributes.isRegularFile())) {
        found.add(file);
      }
      return FileVisitResult.CONTINUE;
    }

    @Override
    public FileVisitResult visitFileFailed(Path file, IOException e) throws IOException {
      if (file.equals(folder)) {
        throw e;
      }
      unread.accept(file + ": cannot be looked into, and was left out. Check who may read it.");
      return FileVisitResult.CONTINUE;
    }

    private boolean staysInside(Path link) throws IOException {
      return Files.isRegularFile(link) && link.toRealPath().startsWith(root);
    }
  }
}
