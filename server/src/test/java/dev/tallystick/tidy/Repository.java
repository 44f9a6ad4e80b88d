package dev.tallystick.tidy;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;

/** The files of this repository, as a fresh clone has them. */
public final class Repository {
  private static final Set<String> NOT_OURS = Set.of(".git", "target", "node_modules", ".idea");
  private static final Pattern COMMENT =
      Pattern.compile("/\\*.*?\\*/|//[^\n]*", Pattern.DOTALL | Pattern.MULTILINE);

  private Repository() {}

  /** The top folder. */
  public static Path root() {
    Path folder = Path.of(System.getProperty("basedir", "")).toAbsolutePath();
    while (!Files.isDirectory(folder.resolve("demo"))
        || !Files.isDirectory(folder.resolve("server"))) {
      folder = folder.getParent();
    }
    return folder;
  }

  /** The folder of the base package in the main sources of the server. */
  static Path main() {
    return root().resolve("server/src/main/java/dev/tallystick");
  }

  /** The test sources of the server. */
  static Path tests() {
    return root().resolve("server/src/test");
  }

  /** The client for VS Code. */
  static Path client() {
    return root().resolve("client-vscode");
  }

  /** The files under a folder that belong to us, sorted, whose names end so. */
  static List<Path> files(Path folder, String... endings) {
    List<Path> files = new ArrayList<>();
    try {
      Files.walkFileTree(folder, new Ours(files, Set.of(endings)));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    Collections.sort(files);
    return files;
  }

  /** A text file. */
  public static String read(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      throw new UncheckedIOException(file.toString(), e);
    }
  }

  /** A Java file without its comments. */
  static String code(Path file) {
    return COMMENT.matcher(read(file)).replaceAll("");
  }

  /** A path as seen from the top folder. */
  static String shown(Path file) {
    return root().relativize(file).toString().replace('\\', '/');
  }

  /** Collects files by their endings. */
  private static final class Ours extends SimpleFileVisitor<Path> {
    private final List<Path> files;
    private final Set<String> endings;

    Ours(List<Path> files, Set<String> endings) {
      this.files = files;
      this.endings = endings;
    }

    @Override
    public FileVisitResult preVisitDirectory(Path folder, BasicFileAttributes attributes) {
      boolean ours = !NOT_OURS.contains(String.valueOf(folder.getFileName()));
      return ours ? FileVisitResult.CONTINUE : FileVisitResult.SKIP_SUBTREE;
    }

    @Override
    public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
      if (endings.stream().anyMatch(file.toString()::endsWith)) {
        files.add(file);
      }
      return FileVisitResult.CONTINUE;
    }
  }
}
