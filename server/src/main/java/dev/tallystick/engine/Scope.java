package dev.tallystick.engine;

import java.nio.file.Path;
import java.util.Collection;
import java.util.Set;
import java.util.TreeSet;

/** Which folders are watched as a whole: all their pairs, not only those with an open side. */
final class Scope {
  private final Set<Path> wanted = new TreeSet<>();
  private boolean folders;
  private boolean declined;

  /**
   * The setting: all folders of the workspace, or none. A change makes up for what was declined.
   */
  void set(boolean allFolders) {
    declined &= folders == allFolders;
    folders = allFolders;
  }

  /** The user wants these, whatever the setting. */
  void want(Collection<Path> paths) {
    wanted.addAll(paths);
  }

  /** The user wants none of them any more. */
  void decline() {
    wanted.clear();
    declined = true;
  }

  /**
   * Whether a folder is watched as a whole.
   *
   * @param named whether the editor names it as a folder of the workspace
   */
  boolean whole(Path folder, boolean named) {
    return wanted.contains(folder) || folders && named && !declined;
  }
}
