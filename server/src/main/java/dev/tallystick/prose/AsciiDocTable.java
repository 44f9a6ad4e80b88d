package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * The cells of an AsciiDoc table, from one separator to the next, over as many lines as it takes. A
 * blank line parts a cell's paragraphs. The bars of a table inside a cell part cells like others.
 */
final class AsciiDocTable {
  /** How a cell spans, repeats, is set and is read: {@code 2.3+^.>s}. */
  private static final Pattern SPECIFIER =
      Pattern.compile(
          "(?:(?:\\d{1,9}(?:\\.\\d{1,9})?|\\.\\d{1,9})[*+])?"
              + "(?:[<^>](?:\\.[<^>])?|\\.[<^>])?[adehlmsv]?");

  private static final int LONGEST_SPECIFIER = 30;

  private final String file;
  private final char separator;
  private final List<Block> blocks = new ArrayList<>();
  private final List<Span> cell = new ArrayList<>();

  /** How the cell is read, {@code l} as it stands and {@code a} like a document; else a blank. */
  private char style = ' ';

  private AsciiDocTable(String file, char separator) {
    this.file = file;
    this.separator = separator;
  }

  /**
   * The cells in order.
   *
   * @param lines those between the delimiters
   * @param separator what parts cells
   */
  static List<Block> blocks(String file, List<Span> lines, char separator) {
    AsciiDocTable table = new AsciiDocTable(file, separator);
    lines.forEach(table::read);
    table.close();
    return table.blocks;
  }

  private void read(Span line) {
    String words = line.of(file);
    if (line.isEmpty() || isDelimiter(words)) {
      close();
    } else if (separator == ',' || separator == ':') {
      readValues(line);
    } else if (!AsciiDocSyntax.isComment(words)) {
      readCells(line);
    }
  }

  private void readCells(Span line) {
    int from = line.start();
    for (int at = line.start(); at < line.end(); at++) {
      char c = file.charAt(at);
      if (c == '\\') {
        at++;
      } else if (c == separator || c == '!' && opensNested(line, at)) {
        int specifier = specifier(line.start(), from, at);
        add(from, specifier);
        close();
        style = at > specifier ? file.charAt(at - 1) : ' ';
        from = at + 1;
      }
    }
    add(from, line.end());
  }

  /** Whether a table inside a cell has a cell here: its marks stand behind blanks. */
  private boolean opensNested(Span line, int at) {
    return file.charAt(line.start()) == '!'
        && (at == line.start() || Characters.isBlank(file.charAt(at - 1)));
  }

  /** Where the specifier before a separator begins; at the separator if there is none. */
  private int specifier(int lineStart, int from, int separatorAt) {
    int at = separatorAt;
    while (at > from
        && separatorAt - at < LONGEST_SPECIFIER
        && !Characters.isBlank(file.charAt(at - 1))) {
      at--;
    }
    boolean begins = at == lineStart || at > 0 && Characters.isBlank(file.charAt(at - 1));
    return begins && SPECIFIER.matcher(file).region(at, separatorAt).matches() ? at : separatorAt;
  }

  /** Values as spreadsheets write them, some in quotation marks. */
  private void readValues(Span line) {
    int from = line.start();
    boolean quoted = false;
    for (int at = line.start(); at < line.end(); at++) {
      quoted ^= file.charAt(at) == '"';
      if (file.charAt(at) == separator && !quoted) {
        addValue(from, at);
        from = at + 1;
      }
    }
    addValue(from, line.end());
  }

  private void addValue(int from, int to) {
    boolean quoted = to - from > 1 && file.charAt(from) == '"' && file.charAt(to - 1) == '"';
    add(quoted ? from + 1 : from, quoted ? to - 1 : to);
    close();
  }

  private void add(int from, int to) {
    int start = from;
    int end = to;
    while (start < end && Characters.isSpace(file.charAt(start))) {
      start++;
    }
    while (end > start && Characters.isSpace(file.charAt(end - 1))) {
      end--;
    }
    if (start < end) {
      addLine(new Span(start, end));
    }
  }

  private void addLine(Span line) {
    String words = line.of(file);
    Optional<AsciiDocList.Item> item =
        style == 'a' ? AsciiDocList.item(file, line) : Optional.empty();
    if (isDelimiter(words)) {
      close();
    } else if (item.isPresent() && item.get().term().isEmpty()) {
      close();
      cell.add(item.get().text());
    } else {
      cell.add(line);
    }
  }

  private static boolean isDelimiter(String words) {
    return AsciiDocSyntax.isDelimiter(words) && AsciiDocSyntax.isTable(words);
  }

  private void close() {
    if (!cell.isEmpty()) {
      Span extent = cell.get(0).cover(cell.get(cell.size() - 1));
      if (style == 'l') {
        blocks.add(new Block(Block.Kind.VERBATIM, 0, extent, List.of()));
      } else {
        blocks.addAll(AsciiDocInlines.blocks(Block.Kind.CELL, 0, extent, file, cell));
      }
      cell.clear();
    }
  }
}
