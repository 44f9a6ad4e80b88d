package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * AsciiDoc, read line by line as the language is documented (from memory). A delimiter that is
 * never closed opens nothing, so that what is being written does not swallow the rest of the file.
 */
final class AsciiDoc {
  /** Deeper nesting than any writer uses is not kept. */
  private static final int DEEPEST = 100;

  /** Below the title of the document: the author, and the revision. */
  private static final int HEADER_LINES = 2;

  private final Text text;
  private final String file;
  private final List<Span> lines;
  private final Map<String, Integer> lastDelimiters = new HashMap<>();
  private final AsciiDocBlocks blocks;
  private final Deque<Frame> frames = new ArrayDeque<>();
  private AsciiDocList list = new AsciiDocList(0);
  private AsciiDocStyle style = AsciiDocStyle.NONE;

  /** Level of the item that the next block belongs to; 0 if to none. */
  private int attached;

  /** Whether a term has just come whose description is still to come. */
  private boolean describes;

  private int blankLines;
  private int headerLines;

  /** A delimited block that is open, and what is to be gone on with behind it. */
  private record Frame(String delimiter, boolean quotes, int attached, AsciiDocList outer) {}

  private AsciiDoc(Text text) {
    this.text = text;
    this.file = text.string();
    this.lines = TrimmedLines.of(text);
    this.blocks = new AsciiDocBlocks(file);
  }

  static List<Block> blocks(Text text) {
    AsciiDoc document = new AsciiDoc(text);
    document.read();
    return document.blocks.finished();
  }

  private void read() {
    int first = text.place(FrontMatter.end(text)).line();
    for (int i = first; i < lines.size(); i++) {
      if (AsciiDocSyntax.isDelimiter(line(i))) {
        lastDelimiters.put(line(i), i);
      }
    }
    int at = first;
    while (at < lines.size()) {
      at = read(at);
    }
  }

  /** Reads a line, or several that belong together; the index behind them. */
  private int read(int at) {
    String line = line(at);
    if (line.isEmpty()) {
      blocks.close();
      blankLines++;
      headerLines = 0;
      return at + 1;
    }
    int next = readDirective(at, line);
    if (next == at) {
      next = readMark(at, line);
    }
    if (next == at) {
      next = blocks.isOpen() ? goOn(at, line) : begin(at, line);
    }
    blankLines = 0;
    return next;
  }

  /** What the reader of a document never hands on: comments, conditions, inclusions. */
  private int readDirective(int at, String line) {
    if (AsciiDocSyntax.isComment(line)) {
      return at + 1;
    }
    Optional<Span> content = AsciiDocSyntax.directive(file, lines.get(at));
    content.filter(span -> !span.isEmpty()).ifPresent(this::addLine);
    return content.isPresent() ? at + 1 : at;
  }

  private void addLine(Span span) {
    if (blocks.isOpen()) {
      blocks.append(span);
    } else {
      beginParagraph(span.start(), span);
    }
  }

  /** What ends a paragraph even without a blank line. */
  private int readMark(int at, String line) {
    if (AsciiDocSyntax.isDelimiter(line)) {
      return readDelimiter(at, line);
    }
    if (AsciiDocSyntax.isAttributes(line)) {
      blocks.close();
      style = style.and(line);
      return at + 1;
    }
    if (line.equals("+") && !list.isEmpty()) {
      blocks.close();
      list.leave(blankLines);
      attached = list.level();
      return at + 1;
    }
    return at;
  }

  private int readDelimiter(int at, String line) {
    for (Frame frame : frames) {
      if (frame.delimiter().equals(line)) {
        closeFrames(frame);
        return at + 1;
      }
    }
    if (AsciiDocSyntax.isUnderline(blocks.onlyLine(), line)) {
      return underline(at, line);
    }
    blocks.close();
    boolean closed = lastDelimiters.getOrDefault(AsciiDocSyntax.closing(line), 0) > at;
    return closed ? openDelimited(at, line) : at + 1;
  }

  /** Makes a title of the line above. */
  private int underline(int at, String line) {
    int level = AsciiDocSyntax.underlineLevel(line);
    headerLines = blocks.hasNone() && level == 1 ? HEADER_LINES : 0;
    blocks.underline(lines.get(at), level);
    return at + 1;
  }

  private void closeFrames(Frame last) {
    blocks.close();
    while (frames.peek() != last) {
      frames.pop();
    }
    list = frames.pop().outer();
    attached = 0;
    style = AsciiDocStyle.NONE;
  }

  private int openDelimited(int at, String line) {
    String closing = AsciiDocSyntax.closing(line);
    boolean comment = line.startsWith("/") || style.isComment();
    if (!comment && !style.isVerbatim() && AsciiDocSyntax.isContainer(line)) {
      openFrame(line);
      return at + 1;
    }
    int end = at + 1;
    while (!line(end).equals(closing)) {
      end++;
    }
    if (!comment) {
      takeAttached();
      if (AsciiDocSyntax.isTable(line)) {
        AsciiDocTable.blocks(file, lines.subList(at + 1, end), separator(line))
            .forEach(blocks::add);
      } else {
        blocks.addVerbatim(lines.get(at).start(), lines.get(end).end());
      }
    }
    takeStyle();
    return end + 1;
  }

  private void openFrame(String line) {
    boolean quotes = line.startsWith("_") || takeStyle().isQuotation();
    int item = takeAttached();
    if (frames.size() < DEEPEST) {
      frames.push(new Frame(line, quotes, item > 0 ? item : around(), list));
      list = new AsciiDocList(around());
    }
    takeStyle();
  }

  private char separator(String line) {
    return style.commaSeparated() ? ',' : line.charAt(0);
  }

  /** Level of the item that the delimited block around is part of; 0 for none. */
  private int around() {
    return frames.isEmpty() ? 0 : frames.element().attached();
  }

  /** A further line of the block that is open. */
  private int goOn(int at, String line) {
    if (blocks.isItem() && beginItem(at)) {
      return at + 1;
    }
    if (AsciiDocSyntax.isUnderline(blocks.onlyLine(), line)) {
      return underline(at, line);
    }
    Span span = lines.get(at);
    blocks.append(blocks.isQuotation() ? AsciiDocSyntax.withoutQuoteMark(file, span) : span);
    return at + 1;
  }

  private int begin(int at, String line) {
    if (AsciiDocSyntax.isEntry(line)) {
      return AsciiDocSyntax.behindEntry(file, lines, at);
    }
    if (headerLines > 0 && AsciiDocSyntax.isHeaderLine(line)) {
      headerLines--;
      return at + 1;
    }
    headerLines = 0;
    boolean described = describes;
    describes = false;
    if (AsciiDocSyntax.isRule(line)) {
      takeAttached();
    } else if (!beginHeading(at) && !addMacro(at, line) && !beginItem(at)) {
      beginText(at, isIndented(at) && !described);
    }
    return at + 1;
  }

  private boolean beginHeading(int at) {
    Span line = lines.get(at);
    Optional<Span> title = AsciiDocSyntax.blockTitle(file, line);
    if (title.isPresent() && !isIndented(at)) {
      blocks.open(Block.Kind.PARAGRAPH, 0, line.start(), title.get());
      blocks.close();
      return true;
    }
    Optional<AsciiDocSyntax.Title> heading = AsciiDocSyntax.heading(file, line);
    if (heading.isEmpty() || isIndented(at)) {
      return false;
    }
    headerLines = blocks.hasNone() && heading.get().level() == 1 ? HEADER_LINES : 0;
    takeStyle();
    takeAttached();
    blocks.open(Block.Kind.HEADING, heading.get().level(), line.start(), heading.get().text());
    blocks.endAt(line.end());
    blocks.close();
    return true;
  }

  /** A macro that stands for a block: of an image the description is prose. */
  private boolean addMacro(int at, String line) {
    Optional<List<Span>> prose = AsciiDocSyntax.blockMacro(file, lines.get(at));
    if (prose.isEmpty() || isIndented(at)) {
      return false;
    }
    takeStyle();
    takeAttached();
    blocks.addMacro(lines.get(at), prose.get());
    return true;
  }

  private boolean beginItem(int at) {
    Optional<AsciiDocList.Item> item = AsciiDocList.item(file, lines.get(at));
    if (item.isEmpty()) {
      return false;
    }
    blocks.close();
    takeStyle();
    attached = 0;
    int level = list.enter(item.get().marker());
    int start = lines.get(at).start();
    item.get()
        .term()
        .ifPresent(
            term -> {
              blocks.open(Block.Kind.ITEM, level, start, term);
              blocks.endAt(item.get().behindMarker());
              blocks.close();
            });
    describes = item.get().text().isEmpty();
    if (describes) {
      attached = level;
    } else {
      int from = item.get().term().isPresent() ? item.get().text().start() : start;
      blocks.open(Block.Kind.ITEM, level, from, item.get().text());
    }
    return true;
  }

  private void beginText(int at, boolean literal) {
    Span span = lines.get(at);
    if (style.isVerbatim() || style.isComment() || literal && !style.isProse()) {
      boolean comment = takeStyle().isComment();
      attached = 0;
      blocks.openVerbatim(span, comment);
    } else {
      beginParagraph(span.start(), span);
    }
  }

  private void beginParagraph(int start, Span first) {
    Span unquoted = AsciiDocSyntax.withoutQuoteMark(file, first);
    int quotes = takeStyle().isQuotation() || !unquoted.equals(first) ? 1 : 0;
    int item = takeAttached();
    for (Frame frame : frames) {
      quotes += frame.quotes() ? 1 : 0;
    }
    Span words = AsciiDocSyntax.withoutLabel(file, unquoted);
    if (quotes > 0) {
      blocks.open(Block.Kind.QUOTATION, quotes, start, words);
    } else if (item + around() > 0) {
      blocks.open(Block.Kind.ITEM, item > 0 ? item : around(), start, words);
    } else {
      blocks.open(Block.Kind.PARAGRAPH, 0, start, words);
    }
  }

  private AsciiDocStyle takeStyle() {
    AsciiDocStyle taken = style;
    style = AsciiDocStyle.NONE;
    return taken;
  }

  /** The item that a block belongs to; one that belongs to none ends the list. */
  private int takeAttached() {
    int taken = attached;
    attached = 0;
    if (taken == 0) {
      list.clear();
    }
    return taken;
  }

  private boolean isIndented(int at) {
    int start = text.lineStart(at);
    return lines.get(at).start() > start && Characters.isBlank(file.charAt(start));
  }

  private String line(int at) {
    return lines.get(at).of(file);
  }
}
