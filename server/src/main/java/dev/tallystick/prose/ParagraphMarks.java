package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Marks at the start of a paragraph that the Markdown parser takes for text. */
final class ParagraphMarks {
  private final String file;
  private final List<Span> pieces;
  private int next;

  private ParagraphMarks(String file, List<Span> pieces) {
    this.file = file;
    this.pieces = pieces;
  }

  /** What a paragraph may open with. */
  enum Mark {
    /** Nothing. */
    NONE("(?!)"),
    /** The box of a task. */
    TASK("\\[[ xX]][ \\t]+"),
    /** The kind of an alert as GitHub has them; some readers let a title follow. */
    ALERT("\\[![A-Za-z][\\w-]*+][-+]?[ \\t]*");

    private final Pattern pattern;

    Mark(String pattern) {
      this.pattern = Pattern.compile(pattern);
    }
  }

  /** A stretch of a paragraph that stands for itself, with its prose. */
  record Part(Span extent, List<Span> pieces) {}

  /**
   * Takes the mark out of the prose of a paragraph, and parts it behind the line of an alert.
   *
   * @param lines the paragraph's lines, container marks left out
   */
  static List<Part> parts(String file, List<Span> lines, List<Span> pieces, Mark mark) {
    Span first = lines.get(0);
    Span all = new Span(first.start(), lines.get(lines.size() - 1).end());
    Matcher matcher = mark.pattern.matcher(file).region(first.start(), first.end());
    boolean found = matcher.lookingAt();
    ParagraphMarks marks = new ParagraphMarks(file, pieces);
    if (!found || mark == Mark.TASK || lines.size() == 1) {
      int from = found ? matcher.end() : first.start();
      return List.of(new Part(all, marks.take(from, all.end())));
    }
    List<Part> parts = new ArrayList<>();
    parts.add(new Part(first, marks.take(matcher.end(), first.end())));
    Span rest = new Span(lines.get(1).start(), all.end());
    parts.add(new Part(rest, marks.take(rest.start(), rest.end())));
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
}
