package dev.tallystick.engine;

import dev.tallystick.text.Text;
import java.util.List;
import java.util.OptionalInt;

/**
 * What is to be shown in a file, in place of all that was shown there before.
 *
 * @param uri the file, as the editor names it
 * @param version the number of the text that this is about; none if the editor does not show it
 * @param text that text
 * @param notices sorted by place
 */
public record Publication(String uri, OptionalInt version, Text text, List<Notice> notices) {
  /** Keeps the notices unchangeable. */
  public Publication {
    notices = List.copyOf(notices);
  }
}
