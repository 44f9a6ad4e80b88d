package dev.tallystick.aid;

import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.prose.Margin;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Edit;
import dev.tallystick.text.Scripts;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.stream.Collectors;

/** Puts sentences into a block of the translation, beside one that stands there. */
final class Inline {
  private final Reading source;
  private final Reading target;
  private final Copy copy;
  private final String lineEnd;
  private final int margin;

  /**
   * A place beside a sentence of the translation.
   *
   * @param segment its index
   * @param behind whether the place is behind it, not before
   */
  record Point(int segment, boolean behind) {}

  Inline(PairResult result, Format format, String lineEnd) {
    this.source = result.source();
    this.target = result.target();
    this.copy = new Copy(source, format);
    this.lineEnd = lineEnd;
    this.margin = Margin.of(target.text()).orElse(Integer.MAX_VALUE);
  }

  /** Puts sentences of the source there, given by their indices. */
  Edit edit(Point point, List<Integer> segments) {
    Block block = target.segments().get(point.segment()).block();
    String indent = Marks.next(target.text(), block);
    List<String> copies = segments.stream().map(copy::of).toList();
    if (onLinesOfTheirOwn(point, segments)) {
      String line = lineEnd + indent;
      return inserted(
          point,
          copies.stream()
              .map(one -> point.behind() ? line + one : one + line)
              .collect(Collectors.joining()));
    }
    if (margin < Integer.MAX_VALUE && flows(block)) {
      Flow flow = new Flow(target.text(), margin, lineEnd, indent);
      boolean first = !point.behind() && beginsLine(point.segment());
      return flow.edit(String.join(" ", copies), place(point), block.extent().end(), first);
    }
    return inserted(point, spaced(point, String.join(" ", copies)));
  }

  private int place(Point point) {
    return point.behind()
        ? Copy.closed(target, point.segment())
        : Copy.opened(target, point.segment());
  }

  private Edit inserted(Point point, String words) {
    int place = place(point);
    return new Edit(new Span(place, place), words);
  }

  private static boolean flows(Block block) {
    return block.kind() == Block.Kind.PARAGRAPH
        || block.kind() == Block.Kind.ITEM
        || block.kind() == Block.Kind.QUOTATION;
  }

  /** Whether both texts have a sentence a line here. */
  private boolean onLinesOfTheirOwn(Point point, List<Integer> segments) {
    int before = point.behind() ? segments.get(0) - 1 : segments.get(segments.size() - 1);
    return breaksBehind(before) && beginsLine(point.segment()) && endsLine(point.segment());
  }

  /** Whether a source sentence has another one of its block behind it, but not on its line. */
  private boolean breaksBehind(int index) {
    List<Segment> segments = source.segments();
    if (index < 0 || index + 1 >= segments.size() || segments.get(index + 1).opens()) {
      return false;
    }
    int end = segments.get(index).span().end();
    int next = segments.get(index + 1).span().start();
    return source.text().place(end).line() < source.text().place(next).line();
  }

  private boolean beginsLine(int index) {
    Text text = target.text();
    Block block = target.segments().get(index).block();
    int start = Copy.opened(target, index);
    int line = text.place(start).line();
    boolean firstLine = line == text.place(block.extent().start()).line();
    String marks = firstLine ? Marks.first(text, block) : Marks.next(text, line);
    return text.lineStart(line) + marks.length() >= start;
  }

  private boolean endsLine(int index) {
    Text text = target.text();
    int end = Copy.closed(target, index);
    return text.string().substring(end, text.lineEnd(text.place(end).line())).isBlank();
  }

  /** With blanks where they are needed: there are none between letters of some scripts. */
  private String spaced(Point point, String words) {
    String text = target.text().string();
    int place = place(point);
    String before = text.substring(0, place);
    String behind = text.substring(place);
    String left = point.behind() && !joins(before, words) ? " " : "";
    boolean closes = behind.startsWith("</"); // the element that the words go into
    boolean touches = !behind.isEmpty() && !Character.isWhitespace(behind.charAt(0)) && !closes;
    boolean cell = point.behind() && behind.startsWith("|");
    String right = touches && (cell || !joins(words, behind)) ? " " : "";
    return left + words + right;
  }

  /** Whether nothing goes between two texts: no blanks are written in the script of either. */
  private static boolean joins(String one, String other) {
    int last = lastLetter(one);
    int first = other.codePoints().filter(Character::isLetterOrDigit).findFirst().orElse('a');
    return Scripts.isUnspaced(last) && Scripts.isUnspaced(first);
  }

  private static int lastLetter(String text) {
    for (int at = text.length(); at > 0; at -= Character.charCount(text.codePointBefore(at))) {
      if (Character.isLetterOrDigit(text.codePointBefore(at))) {
        return text.codePointBefore(at);
      }
    }
    return 'a';
  }
}
