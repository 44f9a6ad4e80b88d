package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Marks at the start of a paragraph's lines that the Markdown parser takes for text. */
final class ParagraphMarks {
  private static final Pattern FOOTNOTE = Pattern.compile("\\[\\^[^\\[\\]\\s]+]:[ \\t]*");
  private static final Pattern TASK = Pattern.compile("\\[[ xX]][ \\t]+");

  private final String file;
  private final List<Span> pieces;
  private int next;

  private ParagraphMarks(String file, List<Span> pieces) {
    this.file = file;
    this.pieces = pieces;
  }

  /** A stretch of a paragraph that stands for itself, with its prose. */
  record Part(Span extent, List<Span> pieces) {}

  /**
   * Parts a paragraph before each line that opens a footnote, and takes the marks out of the prose.
   *
   * @param lines the paragraph's lines, container marks left out
   * @param task whether it may open with the box of a task
   */
  static List<Part> parts(String file, List<Span> lines, List<Span> pieces, boolean task) {
    ParagraphMarks marks = new ParagraphMarks(file, pieces);
    List<Part> parts = new ArrayList<>();
    int first = 0;
    for (int i = 1; i <= lines.size(); i++) {
      if (i == lines.size() || marks.end(lines.get(i), FOOTNOTE) > 0) {
        int box = task && first == 0 ? marks.end(lines.get(0), TASK) : 0;
        int mark = Math.max(marks.end(lines.get(first), FOOTNOTE), box);
        Span extent = new Span(lines.get(first).start(), lines.get(i - 1).end());
        parts.add(new Part(extent, marks.take(Math.max(mark, extent.start()), extent.end())));
        first = i;
      }
    }
    return parts;
  }

  /** The next pieces, as far as they lie between two offsets. */
  private List<Span> take(int start, int end) {
    Pieces taken = new Pieces(file);
    while (next < pieces.size() && pieces.get(next).start() < end) {
      Span piece = pieces.get(next);
      taken.add(Math.max(piece.start(), start), Math.min(piece.end(), end));
      if (piece.end() > end) {
        break;
      }
      next++;
    }
    return taken.spans();
  }

  /** Offset behind the mark that opens a line; 0 if none does. */
  private int end(Span line, Pattern mark) {
    if (line.isEmpty() || file.charAt(line.start()) != '[') {
      return 0; // nearly every line
    }
    Matcher matcher = mark.matcher(file).region(line.start(), line.end());
    return matcher.lookingAt() ? matcher.end() : 0;
  }
}
