package dev.tallystick.aid;

import dev.tallystick.engine.PairResult;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.Collectors;

/**
 * Tries out what is to be put into the translation: read anew, it must have all the prose that it
 * had and that of the new sentences, and its marks must be as whole as they were.
 *
 * @param format of the translation
 */
record Trial(PairResult result, Format format) {
  /**
   * Whether edits do no harm.
   *
   * @param segments the source's segments that they put in
   */
  boolean holds(List<LineEdit> edits, List<Integer> segments) {
    Text before = result.target().text();
    Text after = new Text(applied(before, edits));
    List<Segment> added = segments.stream().map(result.source().segments()::get).toList();
    String is = prose(after, block -> true);
    int grown = prose(after, Trial::isNoNote).length() - prose(before, Trial::isNoNote).length();
    int wanted =
        added.stream()
            .filter(segment -> isNoNote(segment.block()))
            .mapToInt(segment -> dense(segment.prose()).length())
            .sum();
    return grown == wanted
        && added.stream().allMatch(segment -> is.contains(dense(segment.prose())))
        && comesIn(prose(before, block -> true), is)
        && format.marks(after).equals(format.marks(before));
  }

  /** Notes may come along with the sentence that they stand in. */
  private static boolean isNoNote(Block block) {
    return block.kind() != Block.Kind.NOTE;
  }

  private static String applied(Text text, List<LineEdit> edits) {
    StringBuilder applied = new StringBuilder();
    int at = 0;
    for (LineEdit edit : edits) {
      applied.append(text.string(), at, text.lineStart(edit.from())).append(edit.replacement());
      at = edit.to() < text.lines() ? text.lineStart(edit.to()) : text.length();
    }
    return applied.append(text.string(), at, text.length()).toString();
  }

  private String prose(Text text, Predicate<Block> which) {
    return format.blocks(text).stream()
        .filter(which)
        .map(block -> dense(block.prose(text.string())))
        .collect(Collectors.joining());
  }

  /** Its letters and digits: marks between blocks may come along, and no sentence has only such. */
  private static String dense(String prose) {
    return prose.replaceAll("[^\\p{L}\\p{N}]+", "");
  }

  /** Whether all characters of a text come in another one, in their order. */
  private static boolean comesIn(String one, String other) {
    int at = 0;
    for (int i = 0; i < other.length() && at < one.length(); i++) {
      at += other.charAt(i) == one.charAt(at) ? 1 : 0;
    }
    return at == one.length();
  }
}
