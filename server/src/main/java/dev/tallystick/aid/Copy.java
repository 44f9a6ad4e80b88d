package dev.tallystick.aid;

import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * Copies sentences, on one line each, so that they can stand in another text of some format. Their
 * marks come along if they are whole: half of a bold stretch would make bold what follows. What is
 * whole is tried out by reading the copy.
 *
 * @param source where the sentences stand
 * @param format of the text that they are for
 */
record Copy(Reading source, Format format) {
  private static final String OPENING = "*_~`[(\"'\u201C\u2018\u201E\u201A\u00AB\u2039\u00BF\u00A1";

  /** A line break, and what the next line begins with before it goes on with the text. */
  private static final Pattern BREAK = Pattern.compile("[ \\t]*(?:\\r\\n|[\\r\\n])[ \\t]*");

  private static final Pattern QUOTED_BREAK =
      Pattern.compile("[ \\t]*(?:\\r\\n|[\\r\\n])[ \\t]*(?:>[ \\t]?)*[ \\t]*");

  /** What could be read as a mark anywhere, and what could at the start of a line. */
  private static final Pattern MARKS = Pattern.compile("[\\\\`*_\\[\\]<>|&~]");

  /** Where they stand in prose of LaTeX, they had a backslash; formulas have others. */
  private static final Pattern LATEX_MARKS = Pattern.compile("[%&#]");

  /** The end of an element that lies in a sentence; all others end around it. */
  private static final Pattern INLINE_END =
      Pattern.compile(
          "</(?:a|abbr|b|bdi|cite|code|del|dfn|em|i|ins|kbd|mark|q|s|small|span|strong|sub|sup|u"
              + "|var)>");

  private static final Pattern TAG = Pattern.compile("</?[A-Za-z][^<>]*>");

  private static final Pattern FIRST_MARK = Pattern.compile("^(?:([#+=-])|(\\d{1,9})([.)]))");

  /** The sentence with this index. */
  String of(int index) {
    Segment segment = source.segments().get(index);
    String prose = segment.prose().strip();
    Stream<String> raw =
        Stream.of(withMarks(index), segment.span())
            .map(span -> oneLine(segment.block(), span.of(source.text().string())));
    String plain = TAG.matcher(oneLine(segment.block(), segment.span().of(text()))).replaceAll("");
    Stream<String> bare = Stream.of(format == Format.HTML ? plain : prose, prose);
    return Stream.concat(raw, bare)
        .filter(copy -> reads(copy, prose))
        .findFirst()
        .orElseGet(() -> format == Format.HTML ? plain : escaped(prose));
  }

  private static String oneLine(Block block, String raw) {
    boolean quoted = block.kind() == Block.Kind.QUOTATION || block.kind() == Block.Kind.ITEM;
    return (quoted ? QUOTED_BREAK : BREAK).matcher(raw).replaceAll(" ");
  }

  /** Whether a copy, alone on a line, is read as this prose, whatever notes stand in it. */
  private boolean reads(String copy, String prose) {
    List<Block> blocks = format.blocks(new Text(copy));
    return !blocks.isEmpty()
        && blocks.stream().skip(1).allMatch(block -> block.kind() == Block.Kind.NOTE)
        && dense(blocks.get(0).prose(copy)).equals(dense(prose))
        && (format != Format.LATEX || isBalanced(copy))
        && (format != Format.HTML || hasWholeTags(copy));
  }

  /** Whether each tag of a copy that opens something is closed in it. */
  private static boolean hasWholeTags(String copy) {
    return Format.HTML.marks(new Text(copy)).equals(Format.HTML.marks(new Text("")));
  }

  private String text() {
    return source.text().string();
  }

  /** Whether each brace has its counterpart; those with a backslash are characters. */
  private static boolean isBalanced(String copy) {
    int depth = 0;
    for (int i = 0; i < copy.length() && depth >= 0; i++) {
      char c = copy.charAt(i);
      i += c == '\\' ? 1 : 0;
      depth += c == '{' ? 1 : c == '}' ? -1 : 0;
    }
    return depth == 0;
  }

  private static String dense(String prose) {
    return prose.replaceAll("\\s+", "");
  }

  private String escaped(String prose) {
    if (format == Format.LATEX) {
      return LATEX_MARKS.matcher(prose).replaceAll("\\\\$0");
    }
    return switch (format) {
      case MARKDOWN -> escapedInMarkdown(prose);
      case MDX -> escapedInMarkdown(prose).replaceAll("[{}]", "\\\\$0");
      default -> prose;
    };
  }

  private static String escapedInMarkdown(String prose) {
    String escaped = MARKS.matcher(prose).replaceAll("\\\\$0");
    return FIRST_MARK
        .matcher(escaped)
        .replaceFirst(found -> found.group(1) != null ? "\\\\$1" : "$2\\\\$3");
  }

  /** With the marks around it: those before as far as they open something, those behind all. */
  private Span withMarks(int index) {
    Segment segment = source.segments().get(index);
    int start = opened(source, index);
    return new Span(start, closed(source, index)).cover(segment.span());
  }

  /** Where a sentence starts, with the marks that open something right before it. */
  static int opened(Reading reading, int index) {
    List<Segment> segments = reading.segments();
    Segment segment = segments.get(index);
    int bound =
        segment.opens() ? segment.block().extent().start() : segments.get(index - 1).span().end();
    int at = segment.span().start();
    String text = reading.text().string();
    while (at > bound && OPENING.indexOf(text.charAt(at - 1)) >= 0) {
      at--;
    }
    return at > bound || segment.opens() ? at : segment.span().start();
  }

  /** Where a sentence ends, with all that stands right behind it up to the next blank. */
  static int closed(Reading reading, int index) {
    List<Segment> segments = reading.segments();
    Segment segment = segments.get(index);
    boolean lastOfBlock = index + 1 == segments.size() || segments.get(index + 1).opens();
    int bound =
        lastOfBlock ? segment.block().extent().end() : segments.get(index + 1).span().start();
    int at = segment.span().end();
    String text = reading.text().string();
    boolean tags = reading.format() == Format.HTML || reading.format() == Format.MDX;
    while (at < bound && !isSpace(text.charAt(at))) {
      if (tags && text.charAt(at) == '<') {
        Matcher inline = INLINE_END.matcher(text).region(at, bound);
        if (!inline.lookingAt()) {
          break;
        }
        at = inline.end();
      } else {
        int note = noteEnd(segments, index, at);
        at = note > at ? note : at + 1;
      }
    }
    // Right up to the next sentence: who knows to which of the two the marks belong.
    return at == bound && !lastOfBlock ? segment.span().end() : at;
  }

  /** Offset behind the note that begins at an offset of a segment's block; the offset if none. */
  private static int noteEnd(List<Segment> segments, int index, int at) {
    Block block = segments.get(index).block();
    for (int i = index + 1; i < segments.size(); i++) {
      Block next = segments.get(i).block();
      boolean note = next.kind() == Block.Kind.NOTE;
      if (!note && !next.equals(block)) {
        return at;
      }
      if (note && next.extent().start() == at) {
        return next.extent().end();
      }
    }
    return at;
  }

  private static boolean isSpace(char c) {
    return Character.isWhitespace(c) || Character.isSpaceChar(c);
  }
}
