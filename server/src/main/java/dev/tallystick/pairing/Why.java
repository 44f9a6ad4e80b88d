package dev.tallystick.pairing;

import java.util.Locale;

/** How two files were found to belong together. */
public enum Why {
  /** A tag in a file's name: {@code guide.de.md}. */
  NAME,
  /** A folder named by a tag: {@code de/guide.md}. */
  FOLDER,
  /** The project states it: {@code pairs} in {@code tallystick.json}. */
  PROJECT,
  /** The user named the two on the command line or by a command. */
  ARGUMENT;

  /** The word for it in what other programs read. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
