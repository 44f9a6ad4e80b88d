package dev.tallystick.engine;

import java.util.List;

/** Keeps an eye on folders where the editor does not, and posts what happens to the loop. */
public interface Watch extends AutoCloseable {
  /** Watches these folders from now on, and no others. */
  void over(List<Folder> folders);

  @Override
  void close();
}
