package dev.tallystick.prose;

import java.util.HashSet;
import java.util.Set;
import org.commonmark.parser.beta.InlineContentParser;
import org.commonmark.parser.beta.InlineContentParserFactory;
import org.commonmark.parser.beta.InlineParserState;
import org.commonmark.parser.beta.ParsedInline;
import org.commonmark.parser.beta.Scanner;

/**
 * What generators of sites replace or take away: shortcodes, tags of templates, attributes such as
 * <code>{#id}</code>. Values between two braces stay: they are words of a sentence.
 */
final class Shortcode implements InlineContentParser {
  /** Marks that are nowhere in the rest of the block. */
  private final Set<String> missing = new HashSet<>();

  static InlineContentParserFactory factory() {
    return new InlineContentParserFactory() {
      @Override
      public Set<Character> getTriggerCharacters() {
        return Set.of('{');
      }

      @Override
      public InlineContentParser create() {
        return new Shortcode();
      }
    };
  }

  @Override
  public ParsedInline tryParse(InlineParserState state) {
    Scanner scanner = state.scanner();
    scanner.next();
    String close = close(scanner);
    if (close.isEmpty() || missing.contains(close)) {
      return attributes(scanner) ? passed(scanner) : ParsedInline.none();
    }
    while (scanner.find(close.charAt(0)) >= 0) {
      if (scanner.next(close)) {
        return passed(scanner);
      }
      scanner.next();
    }
    missing.add(close);
    return ParsedInline.none();
  }

  private static ParsedInline passed(Scanner scanner) {
    return ParsedInline.of(new Passed(), scanner.position());
  }

  private static String close(Scanner scanner) {
    if (scanner.next("{<")) {
      return ">}}";
    }
    return scanner.next("{%") ? "%}}" : scanner.next('%') ? "%}" : "";
  }

  private static boolean attributes(Scanner scanner) {
    if (!scanner.next(':') && !((scanner.next('#') || scanner.next('.')) && isName(scanner))) {
      return false;
    }
    while (scanner.hasNext() && "{}\n".indexOf(scanner.peek()) < 0) {
      scanner.next();
    }
    return scanner.next('}');
  }

  private static boolean isName(Scanner scanner) {
    return Character.isLetter(scanner.peek()) || scanner.peek() == '_';
  }

  /** Whether from an offset on nothing else is on a line. */
  static boolean isAlone(String line, int start) {
    int at = start;
    while (at < line.length()) {
      int end = Characters.isSpace(line.charAt(at)) ? at + 1 : end(line, at);
      if (end < 0) {
        return false;
      }
      at = end;
    }
    return true;
  }

  /** Offset behind the mark at an offset of a line; -1 if there is none. */
  private static int end(String line, int at) {
    String close =
        line.startsWith("{{<", at)
            ? ">}}"
            : line.startsWith("{{%", at) ? "%}}" : line.startsWith("{%", at) ? "%}" : "";
    if (close.isEmpty()) {
      boolean marked = line.startsWith("{:", at) || line.startsWith("{#", at);
      int end = line.indexOf('}', at);
      return marked && end >= 0 && line.lastIndexOf('{', end) == at ? end + 1 : -1;
    }
    int end = line.indexOf(close, at + 2);
    return end < 0 ? -1 : end + close.length();
  }
}
