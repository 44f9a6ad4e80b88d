package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the lines of AsciiDoc look like. Lines come without the white space around them. */
final class AsciiDocSyntax {
  private static final String UNDERLINES = "=-~^+";
  private static final Pattern DELIMITER =
      Pattern.compile(
          "-{4,}|\\.{4,}|\\+{4,}|/{4,}|={4,}|\\*{4,}|_{4,}|--|`{3}[\\w+#-]*+|[|,:!]={3,}");
  private static final Pattern DIRECTIVE =
      Pattern.compile("(?:(ifn?def)|ifeval|endif|include)::[^\\[]*+\\[(.*)]");
  private static final Pattern ATTRIBUTES =
      Pattern.compile("\\[(?:[\\w.#%{,\"'].*|\\[[\\p{L}_:][\\w:.-]*+(?:,.*)?])?]");
  private static final Pattern ENTRY = Pattern.compile(":!?\\w[\\w-]*+!?:(?:[ \\t].*)?");
  private static final Pattern HEADING =
      Pattern.compile("(={1,6}|#{1,6})[ \\t]++(?=\\S)(.*?)(?:(?<=\\S)[ \\t]++\\1)?");
  private static final Pattern TITLE = Pattern.compile("\\.(\\.?[^ \\t.].*)");
  private static final Pattern RULE =
      Pattern.compile("'{3,}|<{3,}|-{3}|\\*{3}|([-*])[ \\t]+\\1[ \\t]+\\1");
  private static final Pattern MACRO = Pattern.compile("(\\w[\\w-]*+)::[^\\s\\[]*+\\[(.*)]");
  private static final Pattern LABEL =
      Pattern.compile("(?:NOTE|TIP|IMPORTANT|WARNING|CAUTION):[ \\t]++");
  private static final Pattern QUOTE_MARK = Pattern.compile(">(?:[ \\t]++|$)");
  private static final Pattern REVISION = Pattern.compile("v?\\d.*");
  private static final int LONGEST_NAME = 4;

  private AsciiDocSyntax() {}

  /**
   * A heading.
   *
   * @param level from 1
   * @param text its words
   */
  record Title(int level, Span text) {}

  static boolean isDelimiter(String line) {
    return DELIMITER.matcher(line).matches();
  }

  /** The line that ends what a delimiter begins. */
  static String closing(String delimiter) {
    return delimiter.startsWith("`") ? "```" : delimiter;
  }

  /** Whether what is between two such delimiters is read like what is outside. */
  static boolean isContainer(String delimiter) {
    return "=*_".indexOf(delimiter.charAt(0)) >= 0 || delimiter.equals("--");
  }

  static boolean isTable(String delimiter) {
    return delimiter.endsWith("===") && "|,:!".indexOf(delimiter.charAt(0)) >= 0;
  }

  static boolean isComment(String line) {
    return line.startsWith("//") && !line.startsWith("///");
  }

  /** The text in the brackets of a condition, mostly empty; no value if the line is another. */
  static Optional<Span> directive(String file, Span line) {
    Matcher directive = DIRECTIVE.matcher(file).region(line.start(), line.end());
    if (!directive.matches()) {
      return Optional.empty();
    }
    boolean text = directive.group(1) != null;
    return Optional.of(new Span(text ? directive.start(2) : directive.end(2), directive.end(2)));
  }

  /** Whether a line in brackets says something of the block below. */
  static boolean isAttributes(String line) {
    return line.startsWith("[") && ATTRIBUTES.matcher(line).matches();
  }

  static boolean isEntry(String line) {
    return line.startsWith(":") && ENTRY.matcher(line).matches();
  }

  /** Index of the line behind an entry, whose value goes on behind a backslash. */
  static int behindEntry(String file, List<Span> lines, int entry) {
    int at = entry;
    while (at + 1 < lines.size() && !lines.get(at).isEmpty() && goesOn(file, lines.get(at))) {
      at++;
    }
    return at + 1;
  }

  private static boolean goesOn(String file, Span line) {
    return file.startsWith(" \\", line.end() - 2);
  }

  /** The author or the revision below the title of a document. */
  static boolean isHeaderLine(String line) {
    return line.contains("@")
        || REVISION.matcher(line).matches()
        || line.split("[ \\t]+", LONGEST_NAME + 2).length <= LONGEST_NAME;
  }

  static Optional<Title> heading(String file, Span line) {
    Matcher heading = HEADING.matcher(file).region(line.start(), line.end());
    return heading.matches()
        ? Optional.of(
            new Title(
                heading.end(1) - heading.start(1), new Span(heading.start(2), heading.end(2))))
        : Optional.empty();
  }

  /** The words of a title above a block. */
  static Optional<Span> blockTitle(String file, Span line) {
    Matcher title = TITLE.matcher(file).region(line.start(), line.end());
    return title.matches() ? Optional.of(new Span(title.start(1), title.end(1))) : Optional.empty();
  }

  /** Whether a line below another makes a title of it. */
  static boolean isUnderline(String title, String line) {
    char mark = line.charAt(0);
    return UNDERLINES.indexOf(mark) >= 0
        && line.length() > 1
        && Math.abs(title.codePointCount(0, title.length()) - line.length()) < 2
        && line.chars().allMatch(c -> c == mark)
        && title.codePoints().anyMatch(Character::isLetterOrDigit);
  }

  static int underlineLevel(String line) {
    return UNDERLINES.indexOf(line.charAt(0)) + 1;
  }

  /** A line that parts what is above from what is below. */
  static boolean isRule(String line) {
    return RULE.matcher(line).matches();
  }

  /** The prose of a macro that stands for a block; no value if the line is none. */
  static Optional<List<Span>> blockMacro(String file, Span line) {
    Matcher macro = MACRO.matcher(file).region(line.start(), line.end());
    if (!macro.matches()) {
      return Optional.empty();
    }
    boolean image = macro.group(1).equals("image");
    Span text = AsciiDocMacro.positional(file, new Span(macro.start(2), macro.end(2)));
    return Optional.of(image && !text.isEmpty() ? List.of(text) : List.of());
  }

  /** A first line without the label of a note. */
  static Span withoutLabel(String file, Span line) {
    return without(LABEL, file, line);
  }

  /** A line without the mark of a quotation as Markdown has it. */
  static Span withoutQuoteMark(String file, Span line) {
    return without(QUOTE_MARK, file, line);
  }

  private static Span without(Pattern mark, String file, Span line) {
    Matcher matcher = mark.matcher(file).region(line.start(), line.end());
    return matcher.lookingAt() ? new Span(matcher.end(), line.end()) : line;
  }
}
