package dev.tallystick.aid;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Scripts;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Puts words into lines that an editor filled up to a margin, and fills them again: from there on,
 * until an old line break leaves a line full enough, or the block ends.
 *
 * @param text the text
 * @param margin columns that a line may have
 * @param lineEnd how lines end
 * @param indent what a new line begins with
 */
record Flow(Text text, int margin, String lineEnd, String indent) {
  /** A line that could take so much more, as a share of the margin, looks like the last one. */
  private static final int SHORT = 5;

  private static final Pattern WORD = Pattern.compile("[^ \\t\\r\\n]+");

  /** A line must not begin with what would be read as a mark there. */
  private static final Pattern MARK = Pattern.compile("[-+*#>=|].*|\\d{1,9}[.)]");

  /**
   * A word that is to be set.
   *
   * @param end where it ends in the text; -1 of a new one
   * @param opens whether it is the first on its line in the text
   */
  private record Word(String word, int end, boolean opens) {}

  /**
   * Puts words in.
   *
   * @param place where
   * @param end where the block ends
   * @param first whether nothing but marks stands before the place on its line
   */
  Edit edit(String words, int place, int end, boolean first) {
    List<Word> all = new ArrayList<>();
    Matcher matcher = WORD.matcher(words);
    while (matcher.find()) {
      all.add(new Word(matcher.group(), -1, false));
    }
    addOld(all, place, end);
    return set(all, place, first);
  }

  /** What stands behind the place, up to the first line that is to break where it does. */
  private void addOld(List<Word> all, int place, int end) {
    int firstLine = text.place(place).line();
    for (int line = firstLine; line <= text.place(end).line(); line++) {
      int from = line == firstLine ? place : text.lineStart(line) + Marks.next(text, line).length();
      int to = Math.min(end, text.lineEnd(line));
      boolean opens = line > firstLine;
      Matcher matcher = WORD.matcher(text.string()).region(Math.min(from, to), to);
      while (matcher.find()) {
        all.add(new Word(matcher.group(), matcher.end(), opens));
        opens = false;
      }
      String words = text.string().substring(Math.min(from, to), to);
      if (words.endsWith("  ") || words.endsWith("\\")) {
        return;
      }
    }
  }

  private Edit set(List<Word> all, int place, boolean first) {
    StringBuilder out = new StringBuilder();
    int column = columns(text.string().substring(text.lineStart(text.place(place).line()), place));
    int end = place;
    boolean bare = first;
    for (Word word : all) {
      int wide = columns(word.word());
      int needed = column + (bare ? 0 : 1) + wide;
      if (word.opens() && needed > margin - margin / SHORT && !bare) {
        return new Edit(new Span(place, end), out.toString());
      }
      if (bare || needed <= margin || MARK.matcher(word.word()).matches()) {
        out.append(bare ? "" : " ").append(word.word());
        column = needed;
      } else {
        out.append(lineEnd).append(indent).append(word.word());
        column = columns(indent) + wide;
      }
      end = Math.max(end, word.end());
      bare = false;
    }
    return new Edit(new Span(place, end), out.toString());
  }

  private static int columns(String words) {
    return words.codePoints().map(c -> Scripts.isUnspaced(c) ? 2 : 1).sum();
  }
}
