package dev.tallystick.lsp;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** A folder with a job in it. */
record Work(Path folder) {
  /** The ferry in English and German, the German without the sentence on fog. */
  static Work withoutFog(Path folder) {
    Work work = new Work(folder);
    work.write("en/ferry.md", Ferry.EN);
    work.write("de/ferry.md", Ferry.DE_WITHOUT_FOG);
    return work;
  }

  Path write(String name, String text) {
    try {
      Path file = folder.resolve(name);
      Files.createDirectories(file.getParent());
      return Files.writeString(file, text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  void delete(String name) {
    try {
      Files.delete(folder.resolve(name));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  Path file(String name) {
    return folder.resolve(name);
  }

  Path en() {
    return file("en/ferry.md");
  }

  Path de() {
    return file("de/ferry.md");
  }

  Path fr() {
    return file("fr/ferry.md");
  }
}
