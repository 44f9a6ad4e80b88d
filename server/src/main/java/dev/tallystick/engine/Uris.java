package dev.tallystick.engine;

import java.nio.file.Path;

/** How the editor names files. */
@FunctionalInterface
interface Uris {
  String uri(Path file);
}
