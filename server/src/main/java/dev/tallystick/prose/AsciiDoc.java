package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * AsciiDoc, read line by line as the language is documented (from memory). A delimiter that is
 * never closed opens nothing, so that what is being written does not swallow the rest of the file.
 */
final class AsciiDoc {
  /** Below the title of the document: the author, and the revision. */
  private static final int HEADER_LINES = 2;

  private final Text text;
  private final String file;

  /** Index of the first line behind the front matter. */
  private final int first;

  private final List<Span> lines;
  private final Map<String, Integer> lastDelimiters = new HashMap<>();
  private final AsciiDocBlocks blocks;
  private final AsciiDocNesting nesting = new AsciiDocNesting();
  private AsciiDocStyle style = AsciiDocStyle.NONE;

  /** Whether a term has just come whose description is still to come. */
  private boolean describes;

  private int blankLines;
  private int headerLines;

  private AsciiDoc(Text text, FrontMatter data) {
    this.text = text;
    this.first = text.place(data.end()).line();
    this.file = text.string();
    this.lines = TrimmedLines.of(text);
    this.blocks = new AsciiDocBlocks(file);
  }

  static List<Block> blocks(Text text, FrontMatterKeys keys) {
    FrontMatter data = FrontMatter.of(text);
    AsciiDoc document = new AsciiDoc(text, data);
    document.read();
    List<Block> blocks = new ArrayList<>(data.blocks(keys));
    blocks.addAll(document.blocks.finished());
    return List.copyOf(blocks);
  }

  private void read() {
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
    if (line.equals("+") && nesting.isInList()) {
      blocks.close();
      nesting.attach(blankLines);
      return at + 1;
    }
    return at;
  }

  private int readDelimiter(int at, String line) {
    if (nesting.isOpen(line)) {
      blocks.close();
      nesting.close(line);
      style = AsciiDocStyle.NONE;
      return at + 1;
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

  private int openDelimited(int at, String line) {
    String closing = AsciiDocSyntax.closing(line);
    boolean comment = line.startsWith("/") || style.isComment();
    if (!comment && !style.isVerbatim() && AsciiDocSyntax.isContainer(line)) {
      nesting.open(line, line.startsWith("_") || style.isQuotation());
      takeStyle();
      return at + 1;
    }
    int end = at + 1;
    while (!line(end).equals(closing)) {
      end++;
    }
    if (!comment) {
      nesting.takeItem();
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

  private char separator(String line) {
    return style.commaSeparated() ? ',' : line.charAt(0);
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
      nesting.takeItem();
    } else if (!beginHeading(at) && !addMacro(at) && !beginItem(at)) {
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
    nesting.takeItem();
    blocks.open(Block.Kind.HEADING, heading.get().level(), line.start(), heading.get().text());
    blocks.endAt(line.end());
    blocks.close();
    return true;
  }

  /** A macro that stands for a block: of an image the description is prose. */
  private boolean addMacro(int at) {
    Optional<List<Span>> prose = AsciiDocSyntax.blockMacro(file, lines.get(at));
    if (prose.isEmpty() || isIndented(at)) {
      return false;
    }
    takeStyle();
    nesting.takeItem();
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
    int level = nesting.enterList(item.get().marker());
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
      nesting.attach(0);
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
      nesting.keepList();
      blocks.openVerbatim(span, comment);
    } else {
      beginParagraph(span.start(), span);
    }
  }

  private void beginParagraph(int start, Span first) {
    Span unquoted = AsciiDocSyntax.withoutQuoteMark(file, first);
    boolean quotation = takeStyle().isQuotation() || !unquoted.equals(first);
    int quotes = nesting.quotations() + (quotation ? 1 : 0);
    int item = nesting.takeItem();
    Span words = AsciiDocSyntax.withoutLabel(file, unquoted);
    if (quotes > 0) {
      blocks.open(Block.Kind.QUOTATION, quotes, start, words);
    } else if (item > 0) {
      blocks.open(Block.Kind.ITEM, item, start, words);
    } else {
      blocks.open(Block.Kind.PARAGRAPH, 0, start, words);
    }
  }

  private AsciiDocStyle takeStyle() {
    AsciiDocStyle taken = style;
    style = AsciiDocStyle.NONE;
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
