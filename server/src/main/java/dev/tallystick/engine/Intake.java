package dev.tallystick.engine;

import dev.tallystick.prose.Format;
import dev.tallystick.text.Decoded;
import dev.tallystick.text.Decoding;
import java.nio.file.Path;

/** From a file on disk to its text. */
public final class Intake {
  private Intake() {}

  /**
   * The text of a file.
   *
   * @throws Unreadable if there is none
   */
  public static Decoded load(Disk disk, Path file) throws Unreadable {
    return Decoding.decode(disk.read(file))
        .orElseThrow(
            () ->
                new Unreadable(
                    file
                        + ": this is no text file (it has zero bytes)."
                        + " Save it as UTF-8, or as UTF-16 with a byte-order mark."));
  }

  /** The format of a file by its name; a name that says nothing means plain text. */
  public static Format format(Path file) {
    return Format.ofName(String.valueOf(file.getFileName())).orElse(Format.PLAIN);
  }
}
