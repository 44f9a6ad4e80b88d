package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Finds what is no prose within a block of AsciiDoc, in one way from left to right. */
final class AsciiDocMarks {
  private static final String FORMATS = "*_`#";
  private static final String ESCAPABLE = "*_`#^~+{<[|&'\"(";
  private static final Pattern MACRO =
      Pattern.compile(
          "(link|xref|mailto|image|icon|kbd|btn|menu|footnoteref|footnote|pass|stem|latexmath"
              + "|asciimath|indexterm2|indexterm|anchor):(?!:)");
  private static final Pattern ADDRESS = Pattern.compile("(?:https?|ftp|irc|file)://");
  private static final Pattern REFERENCE = Pattern.compile("<<(?=[\\p{L}\\d_:#./{])");
  private static final Set<String> SILENT =
      Set.of("icon", "footnote", "footnoteref", "indexterm", "anchor");
  private static final Set<String> CODE = Set.of("kbd", "pass", "stem", "latexmath", "asciimath");

  private final String prose;
  private final boolean[] marks;
  private final List<Inline> marked;
  private final AsciiDocBrackets brackets;
  private final AsciiDocQuotes quotes;
  private final List<AsciiDocNote> notes;
  private int at;

  private AsciiDocMarks(String prose, List<Inline> marked, List<AsciiDocNote> notes) {
    this.prose = prose;
    this.notes = notes;
    this.marks = new boolean[prose.length()];
    this.marked = marked;
    this.brackets = new AsciiDocBrackets(prose);
    this.quotes = new AsciiDocQuotes(prose, marks, brackets, marked);
  }

  /**
   * Which characters of a block are marks.
   *
   * @param prose its lines, each with an LF
   * @param marked takes what is marked, by offsets into {@code prose}
   * @param notes takes its footnotes, the same way
   */
  static boolean[] of(String prose, List<Inline> marked, List<AsciiDocNote> notes) {
    AsciiDocMarks read = new AsciiDocMarks(prose, marked, notes);
    while (read.at < prose.length()) {
      read.step();
    }
    return read.marks;
  }

  private void step() {
    char c = prose.charAt(at);
    boolean taken =
        switch (c) {
          case '\\' -> escape();
          case '+' -> hardBreak() || passthrough();
          case '[' -> anchor();
          case '<' -> reference() || angled();
          case '(' -> indexTerm();
          default ->
              FORMATS.indexOf(c) >= 0 || c == '^' || c == '~'
                  ? quote()
                  : startsWord() ? macro() || address() : note();
        };
    if (!taken) {
      at++;
    }
  }

  private boolean quote() {
    at = quotes.read(at);
    return true;
  }

  /** A backslash before what would be a mark; what follows is as it stands. */
  private boolean escape() {
    int next = at + 1;
    char c = prose.charAt(Math.min(next, prose.length() - 1));
    if (ESCAPABLE.indexOf(c) >= 0) {
      mark(at, next);
      at = next + 1;
      return true;
    }
    if (c == '\\' && next + 1 < prose.length() && FORMATS.indexOf(prose.charAt(next + 1)) >= 0) {
      mark(at, next + 1);
      at = Math.min(next + 3, prose.length());
      return true;
    }
    if (finds(MACRO, next) || finds(ADDRESS, next)) {
      mark(at, next);
      at = Math.max(next + 1, brackets.wordEnd(next));
      return true;
    }
    return false;
  }

  private boolean hardBreak() {
    boolean last = at > 0 && prose.charAt(at - 1) == ' ' && prose.charAt(at + 1) == '\n';
    if (last) {
      mark(at - 1, at + 1);
      at++;
    }
    return last;
  }

  /** Text between plus signs, which is not read any further. */
  private boolean passthrough() {
    int count = 1;
    while (count < 3 && prose.charAt(at + count) == '+') {
      count++;
    }
    int close = brackets.closingPlus(at, count);
    if (close < 0) {
      at += count;
      return true;
    }
    mark(at, at + count);
    mark(close, close + count);
    add(Inline.Kind.CODE, at, close + count);
    at = close + count;
    return true;
  }

  /** An anchor, which shows nothing. */
  private boolean anchor() {
    int close = brackets.balanced(at);
    char id = prose.charAt(Math.min(at + 2, prose.length() - 1));
    if (close < 0 || brackets.balanced(at + 1) != close - 1 || Character.isDigit(id)) {
      return false;
    }
    mark(at, close + 1);
    at = close + 1;
    return true;
  }

  /** A reference to another place, which shows its text if it has one. */
  private boolean reference() {
    int close = finds(REFERENCE, at) ? brackets.next(">>", at + 2) : -1;
    if (close < 0) {
      return false;
    }
    int comma = brackets.next(",", at);
    boolean text = comma >= 0 && comma < close;
    add(Inline.Kind.LINK, at, close + 2);
    mark(at, text ? comma + 1 : close + 2);
    mark(close, close + 2);
    at = text ? comma + 1 : close + 2;
    return true;
  }

  /** An address in angle brackets. */
  private boolean angled() {
    if (!finds(ADDRESS, at + 1)) {
      return false;
    }
    int close = brackets.next(">", at);
    if (close < 0 || close > brackets.wordEnd(at + 1)) {
      return false;
    }
    mark(at, at + 1);
    mark(close, close + 1);
    at = close + 1;
    return true;
  }

  /** A term of the index: between two brackets it shows, between three it does not. */
  private boolean indexTerm() {
    boolean three = prose.startsWith("(((", at);
    int close = prose.startsWith("((", at) ? brackets.next(three ? ")))" : "))", at + 2) : -1;
    if (close < 0) {
      return false;
    }
    if (three) {
      mark(at, close + 3);
      at = close + 3;
    } else {
      mark(at, at + 2);
      mark(close, close + 2);
      at += 2;
    }
    return true;
  }

  /** A footnote, which may touch the word before it. */
  private boolean note() {
    return prose.startsWith("footnote", at) && macro();
  }

  private boolean macro() {
    Matcher macro = MACRO.matcher(prose).region(at, prose.length());
    if (!macro.lookingAt()) {
      return false;
    }
    String name = macro.group(1);
    int target = macro.end();
    int open = brackets.wordEnd(target);
    int close =
        open < prose.length() && prose.charAt(open) == '['
            ? name.startsWith("footnote") ? brackets.balanced(open) : brackets.close(open + 1)
            : -1;
    if (close < 0) {
      at = target;
      return true;
    }
    if (name.startsWith("footnote")) {
      addNote(name, new Span(at, close + 1), open + 1);
    }
    addMacro(name, close);
    mark(at, target);
    at = target;
    if (SILENT.contains(name) || name.equals("xref") && close == open + 1) {
      mark(target, close + 1);
      at = close + 1;
    } else {
      readMacro(name, target, new Span(open + 1, close));
    }
    return true;
  }

  /** Takes in a footnote that has a text; in the old form of the macro a comma stands before it. */
  private void addNote(String name, Span whole, int from) {
    int close = whole.end() - 1;
    int comma = name.endsWith("ref") ? prose.substring(from, close).indexOf(',') : -1;
    int start = name.endsWith("ref") ? (comma < 0 ? close : from + comma + 1) : from;
    if (!prose.substring(start, close).isBlank()) {
      notes.add(new AsciiDocNote(whole, new Span(start, close)));
    }
  }

  private void addMacro(String name, int close) {
    if (isLink(name)) {
      add(Inline.Kind.LINK, at, close + 1);
    } else if (name.equals("image")) {
      add(Inline.Kind.IMAGE, at, close + 1);
    } else if (CODE.contains(name)) {
      add(Inline.Kind.CODE, at, close + 1);
    }
  }

  private static boolean isLink(String macro) {
    return macro.equals("link") || macro.equals("mailto") || macro.equals("xref");
  }

  private void readMacro(String name, int target, Span text) {
    int open = text.start() - 1;
    boolean link = isLink(name);
    boolean shown = name.equals("menu") || link && text.isEmpty();
    if (!shown) {
      mark(target, open);
    }
    Span words =
        name.equals("image")
            ? AsciiDocMacro.positional(prose, text)
            : link ? AsciiDocMacro.linkText(prose, text) : text;
    mark(open, words.start());
    mark(words.end(), text.end() + 1);
    boolean literal = !link && !name.equals("image");
    at = literal || words.isEmpty() ? text.end() + 1 : words.start();
  }

  /** An address: prose if it is bare, a mark if it has a text. */
  private boolean address() {
    if (!finds(ADDRESS, at)) {
      return false;
    }
    int end = brackets.wordEnd(at);
    int close = prose.charAt(end) == '[' ? brackets.close(end + 1) : -1;
    if (close < 0) {
      at = end;
    } else {
      Span words = AsciiDocMacro.linkText(prose, new Span(end + 1, close));
      add(Inline.Kind.LINK, at, close + 1);
      mark(words.isEmpty() ? end : at, words.start());
      mark(words.end(), close + 1);
      at = words.isEmpty() ? close + 1 : words.start();
    }
    return true;
  }

  private boolean startsWord() {
    return Character.isLetter(prose.charAt(at))
        && (at == 0 || !Character.isLetterOrDigit(prose.charAt(at - 1)));
  }

  private boolean finds(Pattern pattern, int from) {
    return from < prose.length() && pattern.matcher(prose).region(from, prose.length()).lookingAt();
  }

  private void add(Inline.Kind kind, int from, int to) {
    marked.add(new Inline(kind, new Span(from, to)));
  }

  private void mark(int from, int to) {
    Arrays.fill(marks, from, to, true);
  }
}
