package dev.tallystick.aid;

import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/** Puts blocks between the blocks of the translation, parted as the format and the source ask. */
final class Blocks {
  private static final String DELIMITERS = "[ \\t|:>-]*-[ \\t|:-]*";

  /** What front matter ends with. */
  private static final String FENCE = "(?:---|\\.\\.\\.|\\+\\+\\+)[ \\t]*";

  /** Formats in which a blank line parts paragraphs. */
  private static final Set<Format> MARKUP =
      EnumSet.of(Format.MARKDOWN, Format.MDX, Format.ASCIIDOC, Format.RST, Format.LATEX);

  private final Reading source;
  private final Reading target;
  private final Format format;
  private final Copy copy;
  private final String lineEnd;

  Blocks(PairResult result, Format format, String lineEnd) {
    this.source = result.source();
    this.target = result.target();
    this.format = format;
    this.copy = new Copy(source, format);
    this.lineEnd = lineEnd;
  }

  /** Puts sentences behind the block of a target segment; before all if there is none. */
  Edit edit(int segment, List<Group> groups) {
    List<Chunk> chunks = Chunk.of(groups, copy, lineEnd);
    if (target.segments().isEmpty()) {
      return alone(chunks);
    }
    return segment < 0 ? beforeAll(chunks) : behind(outsideOfTable(segment, groups), chunks);
  }

  /** What is no row goes behind the table, not into it. */
  private int outsideOfTable(int segment, List<Group> groups) {
    int at = segment;
    boolean rows = groups.get(0).kind() == Block.Kind.CELL;
    while (!rows && isCell(at) && at + 1 < target.segments().size() && isCell(at + 1)) {
      at++;
    }
    return at;
  }

  private boolean isCell(int segment) {
    return block(target, segment).kind() == Block.Kind.CELL;
  }

  /** Whether a target segment stands in the head of a table, right above the line of dashes. */
  private boolean isHead(int segment) {
    int next = Chunk.lastLine(target, segment) + 1;
    return isCell(segment) && next < target.text().lines() && words(next).matches(DELIMITERS);
  }

  /** Whether rows behind a target segment would come before the head of a table. */
  boolean wouldBehead(int segment) {
    int next = segment + 1;
    return next < target.segments().size()
        && isHead(next)
        && (segment < 0 || Chunk.lastLine(target, segment) < Chunk.firstLine(target, next));
  }

  private Edit behind(int segment, List<Chunk> chunks) {
    Text text = target.text();
    int line = behindFrontMatter(segment);
    line += isHead(segment) ? 1 : 0;
    StringBuilder lines = new StringBuilder();
    Block before = block(target, segment);
    for (Chunk chunk : chunks) {
      blank(chunk.blankBefore(source), before, block(source, chunk.first()))
          .forEach(blank -> lines.append(lineEnd).append(blank));
      lines.append(lineEnd).append(chunk.lines());
      before = block(source, chunk.last());
    }
    boolean goesOn = line + 1 < text.lines() && !words(line + 1).matches(Chunk.BLANK);
    if (goesOn && segment + 1 < target.segments().size()) {
      Chunk last = chunks.get(chunks.size() - 1);
      blank(last.blankBehind(source), before, block(target, segment + 1))
          .forEach(blank -> lines.append(lineEnd).append(blank));
    }
    int place = text.lineEnd(line);
    return new Edit(new Span(place, place), lines.toString());
  }

  /** The last line of a target segment's block; behind a value of front matter, its last one. */
  private int behindFrontMatter(int segment) {
    int line = Chunk.lastLine(target, segment);
    if (block(target, segment).kind() == Block.Kind.METADATA) {
      while (line + 1 < target.text().lines() && !words(line).matches(FENCE)) {
        line++;
      }
    }
    return line;
  }

  private Edit beforeAll(List<Chunk> chunks) {
    Text text = target.text();
    StringBuilder lines = joined(chunks);
    Chunk last = chunks.get(chunks.size() - 1);
    lines.append(lineEnd);
    blank(last.blankBehind(source), block(source, last.last()), block(target, 0))
        .forEach(blank -> lines.append(blank).append(lineEnd));
    int start = text.lineStart(Chunk.firstLine(target, 0));
    int place = text.string().startsWith("\uFEFF", start) ? start + 1 : start;
    return new Edit(new Span(place, place), lines.toString());
  }

  /** Into a translation without a sentence: behind what stands there all the same. */
  private Edit alone(List<Chunk> chunks) {
    String text = target.text().string();
    int start = text.startsWith("\uFEFF") ? 1 : 0;
    int end = text.stripTrailing().length();
    if (end <= start) {
      return new Edit(new Span(start, text.length()), joined(chunks) + lineEnd);
    }
    return new Edit(new Span(end, end), lineEnd + lineEnd + joined(chunks));
  }

  private StringBuilder joined(List<Chunk> chunks) {
    StringBuilder lines = new StringBuilder();
    Block before = null;
    for (Chunk chunk : chunks) {
      if (before != null) {
        lines.append(lineEnd);
        blank(chunk.blankBefore(source), before, block(source, chunk.first()))
            .forEach(blank -> lines.append(blank).append(lineEnd));
      }
      lines.append(chunk.lines());
      before = block(source, chunk.last());
    }
    return lines;
  }

  /** The blank lines between two blocks: those of the source, or one if one is needed. */
  private List<String> blank(List<String> inSource, Block one, Block other) {
    boolean quoted = one.kind() == Block.Kind.QUOTATION && other.kind() == Block.Kind.QUOTATION;
    List<String> blank = new ArrayList<>();
    inSource.forEach(line -> blank.add(quoted ? line : ""));
    if (blank.isEmpty() && needsBlank(one.kind(), other.kind())) {
      blank.add("");
    }
    return blank;
  }

  private boolean needsBlank(Block.Kind one, Block.Kind other) {
    boolean same = one == other && (one == Block.Kind.ITEM || one == Block.Kind.CELL);
    boolean markup = MARKUP.contains(format);
    return markup ? !same && one != Block.Kind.HEADING : !same && hasBlank();
  }

  /** Whether the translation has a blank line between some of its blocks. */
  private boolean hasBlank() {
    for (int i = 1; i < target.segments().size(); i++) {
      if (target.segments().get(i).opens()
          && Chunk.firstLine(target, i) > Chunk.lastLine(target, i - 1) + 1) {
        return true;
      }
    }
    return false;
  }

  private String words(int line) {
    Text text = target.text();
    return text.string().substring(text.lineStart(line), text.lineEnd(line));
  }

  private static Block block(Reading reading, int segment) {
    return reading.segments().get(segment).block();
  }
}
