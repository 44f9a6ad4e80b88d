package dev.tallystick.engine;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Optional;
import java.util.function.Function;

/** One change of a text in the editor. */
public sealed interface Change {
  /** The whole text is new. */
  record Whole(Text text) implements Change {}

  /**
   * A stretch is replaced.
   *
   * @param place finds the stretch in the text current at this change, in UTF-16 offsets; empty if
   *     the text cannot have such a stretch, so that editor and server no longer agree on it
   * @param replacement what comes in its place
   */
  record Part(Function<Text, Optional<Span>> place, String replacement) implements Change {}
}
