package dev.tallystick.segment;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.util.List;

/**
 * An SRX file, read.
 *
 * @param rules what it says, as far as it is right
 * @param problems what is wrong in it, by place; what stands there does not count
 */
public record SrxFile(Srx rules, List<Problem> problems) {
  /** Takes a copy. */
  public SrxFile {
    problems = List.copyOf(problems);
  }

  /** Reads the text of a file, which may be anything. It opens no other, whatever that says. */
  public static SrxFile of(Text text) {
    return new SrxReader(text).read();
  }
}
