package dev.tallystick.engine;

import java.nio.file.Path;
import java.util.Map;

/**
 * Files and folders that have other names now.
 *
 * @param names from the old path to the new one, both absolute
 */
public record Renaming(Map<Path, Path> names) {
  /** What a file is called now: its own name may have changed, or that of a folder around it. */
  public Path of(Path file) {
    for (Path old = file; old != null; old = old.getParent()) {
      Path now = names.get(old);
      if (now != null) {
        return old.equals(file) ? now : now.resolve(old.relativize(file));
      }
    }
    return file;
  }
}
