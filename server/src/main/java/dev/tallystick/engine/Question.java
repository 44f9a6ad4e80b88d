package dev.tallystick.engine;

import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.function.ToIntFunction;

/**
 * What stands for the sentence at a place? Compared by identity: the same place may be asked about
 * twice.
 */
public final class Question {
  private final Path file;
  private final ToIntFunction<Text> place;
  private final Reply reply;

  /** Takes the answer, on the loop's thread. One of the two is called, once. */
  public interface Reply {
    /** The answer. */
    void answer(Answer answer);

    /** The text moved on before the answer was there. */
    void outdated();
  }

  /**
   * Asks about a file.
   *
   * @param place finds the UTF-16 offset in the text current when the question's turn comes
   * @param reply takes the answer
   */
  public Question(Path file, ToIntFunction<Text> place, Reply reply) {
    this.file = file;
    this.place = place;
    this.reply = reply;
  }

  Path file() {
    return file;
  }

  int offset(Text text) {
    return place.applyAsInt(text);
  }

  Reply reply() {
    return reply;
  }
}
