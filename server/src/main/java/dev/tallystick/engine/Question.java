package dev.tallystick.engine;

import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * What is known of a file? Compared by identity: the same may be asked twice.
 *
 * <p>The text current when its turn comes is the one it is about. It waits until the pairs that it
 * rests on are settled, and is outdated by an edit of any of their texts.
 */
public final class Question {
  private final Path file;
  private final Reach reach;
  private final Reply reply;

  /** How far a question reaches. */
  public enum Reach {
    /** To the pairs that the file is in. */
    PAIRS,
    /** Also to the other translations of its source. */
    FAMILY,
    /** To all pairs of a folder. */
    FOLDER
  }

  /** Takes the answer, on the loop's thread. One of the two is called, once. */
  public interface Reply {
    /** The answer. */
    void answer(Known known);

    /** The text moved on before the answer was there, or the folder is no longer looked at. */
    void outdated();
  }

  /** Asks about a file, or about a folder; the empty path means all folders. */
  public Question(Path file, Reach reach, Reply reply) {
    this.file = file;
    this.reach = reach;
    this.reply = reply;
  }

  Path file() {
    return file;
  }

  /** Whether it is about one text, which has to be open and stay as it is. */
  boolean aboutText() {
    return reach != Reach.FOLDER;
  }

  /** Of all pairs those that the answer rests on, in their order. */
  List<FilePair> pairs(Collection<FilePair> all) {
    if (reach == Reach.FOLDER) {
      boolean any = file.toString().isEmpty();
      return all.stream().filter(pair -> any || pair.target().startsWith(file)).toList();
    }
    List<FilePair> own = all.stream().filter(pair -> pair.has(file)).toList();
    if (reach == Reach.PAIRS) {
      return own;
    }
    Set<Path> sources = own.stream().map(FilePair::source).collect(Collectors.toSet());
    return all.stream().filter(pair -> pair.has(file) || sources.contains(pair.source())).toList();
  }

  Reply reply() {
    return reply;
  }
}
