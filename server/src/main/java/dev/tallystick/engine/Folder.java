package dev.tallystick.engine;

import dev.tallystick.project.Names;
import dev.tallystick.project.ProjectFile;
import dev.tallystick.prose.Format;
import java.nio.file.Path;

/**
 * A folder, or the upper part of one.
 *
 * @param path the folder, absolute
 * @param depth how many levels of files count: 1 for those right in it
 */
public record Folder(Path path, int depth) {
  /** Every level counts. */
  public static final int DEEP = Integer.MAX_VALUE;

  /** Whether a file lies in it, and not too deep. */
  boolean holds(Path file) {
    return file.startsWith(path) && file.getNameCount() - path.getNameCount() <= depth;
  }

  /** Whether a list of its files has a file, if there is such a file. */
  boolean lists(Path file) {
    boolean prose = Format.ofName(String.valueOf(file.getFileName())).isPresent();
    boolean ours =
        prose || FolderRules.isRules(file) || file.equals(path.resolve(ProjectFile.NAME));
    return reaches(file) && ours;
  }

  /** Whether a list of its files has a file, or those in a folder, whatever they are. */
  boolean reaches(Path file) {
    if (!holds(file)) {
      return false;
    }
    for (Path name : path.relativize(file)) {
      if (hides(name)) {
        return false;
      }
    }
    return true;
  }

  /** Whether files of this name, or in a folder of this name, are passed over. */
  static boolean hides(Path path) {
    return Names.hides(String.valueOf(path.getFileName()));
  }
}
