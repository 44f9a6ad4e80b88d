package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;

/** One text of front matter while its lines are read; a blank line parts it into blocks. */
final class FrontMatterText {
  private final String file;
  private final String quote;
  private Pieces pieces;
  private int start;
  private int end;

  /**
   * A text of which nothing is read yet.
   *
   * @param quote what ends it; empty if nothing does, null if a comment may
   * @param start offset of its key
   */
  FrontMatterText(String file, String quote, int start) {
    this.file = file;
    this.quote = quote;
    this.pieces = new Pieces(file);
    this.start = start;
  }

  /** Reads a line; whether the text may go on behind it. */
  boolean append(Span line) {
    if (start < 0) {
      start = line.start();
    }
    if (pieces.end() > 0) {
      pieces.addLineBreak(pieces.end(), line.start());
    }
    end = line.end();
    if (quote == null) {
      Span words = withoutComment(line);
      pieces.add(words.start(), words.end());
      return words.equals(line);
    }
    return quote.isEmpty() ? whole(line) : quoted(line);
  }

  private boolean whole(Span line) {
    pieces.add(line.start(), line.end());
    return true;
  }

  private Span withoutComment(Span line) {
    for (int at = line.start() + 1; at < line.end(); at++) {
      if (file.charAt(at) == '#' && Characters.isBlank(file.charAt(at - 1))) {
        int behind = at;
        while (behind > line.start() && Characters.isBlank(file.charAt(behind - 1))) {
          behind--;
        }
        return new Span(line.start(), behind);
      }
    }
    return line;
  }

  /** Reads up to the closing quotation mark; of what a backslash writes only quotes are prose. */
  private boolean quoted(Span line) {
    int at = line.start();
    while (at < line.end()) {
      char c = file.charAt(at);
      boolean more = at + 1 < line.end();
      if (c == '\\' && quote.startsWith("\"")) {
        if (more && "\"\\/".indexOf(file.charAt(at + 1)) >= 0) {
          pieces.add(at + 1, at + 2);
        }
        at += more ? escape(file.charAt(at + 1)) : 1;
      } else if (quote.equals("'") && file.startsWith("''", at) && more) {
        pieces.add(at, at + 1);
        at += 2;
      } else if (file.startsWith(quote, at)) {
        return false;
      } else {
        pieces.add(at, at + 1);
        at++;
      }
    }
    return true;
  }

  /** The length of what a backslash writes, by the letter behind it. */
  private static int escape(char letter) {
    return switch (letter) {
      case 'x' -> 4;
      case 'u' -> 6;
      case 'U' -> 10;
      default -> 2;
    };
  }

  /** Adds the block that is read, if it has prose, and begins another. */
  void finish(List<Block> blocks) {
    List<Span> prose = pieces.spans();
    if (!prose.isEmpty()) {
      blocks.add(new Block(Block.Kind.METADATA, 0, new Span(start, end), prose));
      pieces = new Pieces(file);
      start = -1;
    }
  }
}
