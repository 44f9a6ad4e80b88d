package dev.tallystick.check;

import dev.tallystick.segment.Segment;
import java.util.List;

/**
 * How far a translation has come.
 *
 * @param done source words (letters where the script writes no blanks) that are dealt with
 * @param pending those that nobody has got to yet
 */
public record Progress(int done, int pending) {
  /** Counts a pair as a draft, whatever its state. */
  public static Progress of(Subject subject) {
    Subject draft =
        new Subject(
            subject.source(),
            subject.target(),
            subject.targetLanguage(),
            subject.alignment(),
            true);
    Pending pending = Pending.of(draft);
    List<Segment> source = subject.source();
    int done = 0;
    int waiting = 0;
    for (int i = 0; i < source.size(); i++) {
      int words = WordCount.of(source.get(i).prose());
      if (pending.source(i)) {
        waiting += words;
      } else {
        done += words;
      }
    }
    return new Progress(done, waiting);
  }
}
