package dev.tallystick.engine;

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
}
