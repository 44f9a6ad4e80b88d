package dev.tallystick.lsp;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.PositionEncodingKind;
import org.eclipse.lsp4j.Range;

/** In what a client counts columns. */
enum Encoding {
  /** UTF-16 units, as strings have them. */
  UTF_16(PositionEncodingKind.UTF16) {
    @Override
    int units(int codePoint) {
      return Character.charCount(codePoint);
    }
  },

  /** Bytes of UTF-8. */
  UTF_8(PositionEncodingKind.UTF8) {
    @Override
    int units(int codePoint) {
      if (codePoint < 0x80) {
        return 1;
      }
      if (codePoint < 0x800) {
        return 2;
      }
      return codePoint < 0x10000 ? 3 : 4;
    }
  };

  private final String kind;

  Encoding(String kind) {
    this.kind = kind;
  }

  /** The one to use with a client that offers these: UTF-16 if it can, as everyone must. */
  static Encoding of(List<String> offered) {
    boolean bytesOnly = offered.contains(UTF_8.kind) && !offered.contains(UTF_16.kind);
    return bytesOnly ? UTF_8 : UTF_16;
  }

  /** Its name in the protocol. */
  String kind() {
    return kind;
  }

  /** How many units a code point, or half of one that stands alone, takes. */
  abstract int units(int codePoint);

  /**
   * The offset of a position. A column behind its line means the line's end, a line behind the text
   * the text's end, and a column inside a character that character's start.
   */
  int offset(Text text, Position position) {
    int line = position.getLine();
    if (line >= text.lines()) {
      return text.length();
    }
    if (line < 0) {
      return 0;
    }
    String string = text.string();
    int end = text.lineEnd(line);
    int offset = text.lineStart(line);
    int left = position.getCharacter();
    while (offset < end && left >= units(string.codePointAt(offset))) {
      left -= units(string.codePointAt(offset));
      offset += Character.charCount(string.codePointAt(offset));
    }
    return offset;
  }

  /** The position of an offset; of one inside a surrogate pair, that of the pair. */
  Position position(Text text, int offset) {
    int at = text.outsidePair(offset);
    int line = text.place(at).line();
    String string = text.string();
    int column = 0;
    for (int i = text.lineStart(line); i < at; i += Character.charCount(string.codePointAt(i))) {
      column += units(string.codePointAt(i));
    }
    return new Position(line, column);
  }

  /** The range of a span. */
  Range range(Text text, Span span) {
    return new Range(position(text, span.start()), position(text, span.end()));
  }
}
