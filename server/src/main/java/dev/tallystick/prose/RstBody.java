package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads lines that begin in the same column, and what is indented below them, from top to end. */
final class RstBody {
  /** Deeper nesting than any writer uses is read as text, lest it costs time or stack. */
  private static final int DEEPEST = 50;

  private final RstBlocks blocks;
  private final String file;
  private final RstLines lines;
  private final int base;
  private final RstPlace place;
  private final int depth;

  /**
   * For a body.
   *
   * @param base column that its lines begin in
   * @param depth how many others it is in
   */
  RstBody(RstBlocks blocks, List<RstLine> lines, int base, RstPlace place, int depth) {
    this.blocks = blocks;
    this.file = blocks.file();
    this.lines = new RstLines(lines, base);
    this.base = base;
    this.place = place;
    this.depth = depth;
  }

  void read() {
    while (lines.hasMore()) {
      RstLine line = lines.current();
      if (line.isBlank()) {
        lines.goTo(lines.at() + 1);
      } else if (depth == DEEPEST) {
        addParagraph(line);
      } else if (line.column() > base) {
        nest(lines.takeIndented(lines.at()), place.quotation());
      } else if (!readMark(line)) {
        readText(line);
      }
    }
  }

  private boolean readMark(RstLine line) {
    char first = file.charAt(line.start());
    if (!RstSyntax.isPunctuation(first)) {
      return readItem(line);
    }
    return switch (first) {
      case '.' -> readExplicit(line) || readAdornment(line);
      case ':' -> readField(line) || readAdornment(line);
      case '|' -> readLineBlock(line) || readAdornment(line);
      case '>' -> readDoctest(line) || readAdornment(line);
      case '_' -> readTarget(line) || readAdornment(line);
      case '=' -> readTable(line) || readAdornment(line);
      case '+' -> readTable(line) || readItem(line) || readOption(line) || readAdornment(line);
      default -> readItem(line) || readOption(line) || readAdornment(line);
    };
  }

  private boolean readItem(RstLine line) {
    int behind = RstSyntax.bullet(file, line);
    if (behind < 0) {
      behind = RstSyntax.enumerator(file, line, lines.following(1), lines.hasIndented());
    }
    if (behind < 0) {
      return false;
    }
    RstLine rest = line.behind(file, behind);
    blocks.beginAt(line.start());
    if (rest.isBlank()) {
      nest(lines.takeIndented(lines.at() + 1), place.item());
    } else {
      nest(lines.takeAsDeepAs(rest), place.item());
    }
    blocks.end();
    return true;
  }

  private boolean readField(RstLine line) {
    int colon = RstSyntax.field(file, line);
    if (colon < 0) {
      return false;
    }
    String name = file.substring(line.start() + 1, colon);
    List<RstLine> body = lines.takeContent(line.behind(file, colon + 1));
    if (!RstDirective.isFact(name)) {
      describe(line, body);
    }
    return true;
  }

  private boolean readOption(RstLine line) {
    int behind = RstSyntax.options(file, line);
    boolean described = behind >= 0 && behind < line.end();
    if (behind < 0 || !described && !lines.hasIndented()) {
      return false;
    }
    describe(line, lines.takeContent(line.behind(file, behind)));
    return true;
  }

  private void describe(RstLine line, List<RstLine> body) {
    blocks.beginAt(line.start());
    nest(body, place.item());
    blocks.end();
  }

  private boolean readDoctest(RstLine line) {
    if (!RstSyntax.isMark(file, line, ">>>")) {
      return false;
    }
    int end = lines.behindText();
    blocks.addVerbatim(RstLines.extent(lines.all().subList(lines.at(), end)));
    lines.goTo(end);
    return true;
  }

  /** Lines that stay apart, such as those of a poem; empty ones part its stanzas. */
  private boolean readLineBlock(RstLine line) {
    if (!RstSyntax.isMark(file, line, "|")) {
      return false;
    }
    List<Span> words = new ArrayList<>();
    int start = line.start();
    int end = lines.behindText();
    while (lines.at() < end) {
      RstLine one = lines.current();
      boolean marked = RstSyntax.isMark(file, one, "|");
      if (!marked && one.column() == base) {
        break;
      }
      RstLine rest = marked ? one.behind(file, one.start() + 1) : one;
      if (rest.isBlank()) {
        addLines(words, start);
        words.clear();
      } else {
        start = words.isEmpty() ? one.start() : start;
        words.add(rest.span());
      }
      lines.goTo(lines.at() + 1);
    }
    addLines(words, start);
    return true;
  }

  private boolean readTable(RstLine line) {
    Optional<RstTable> table =
        RstSyntax.isGrid(file, line)
            ? Optional.of(RstGrid.read(file, lines.all(), lines.at(), base))
            : RstSyntax.isBorder(file, line)
                ? Optional.of(RstColumns.read(file, lines.all(), lines.at()))
                : Optional.empty();
    table.ifPresent(
        read -> {
          read.addTo(blocks, depth + 1);
          blocks.end();
          lines.goTo(read.behind());
        });
    return table.isPresent();
  }

  private boolean readExplicit(RstLine line) {
    if (!RstSyntax.isMark(file, line, "..")) {
      return false;
    }
    RstLine rest = line.behind(file, line.start() + 2);
    if (rest.isBlank() && lines.isAlone()) {
      lines.goTo(lines.at() + 1);
      return true;
    }
    Optional<RstDirective> directive = RstDirective.of(file, rest);
    if (directive.isPresent()) {
      List<RstLine> below = lines.takeIndented(lines.at() + 1);
      new RstDirectiveReader(blocks, place, depth + 1).read(directive.get(), line, below);
      return true;
    }
    int note = RstDirective.behindNoteLabel(file, rest);
    List<RstLine> body = lines.takeContent(note < 0 ? rest : rest.behind(file, note));
    if (note >= 0) {
      blocks.beginAt(line.start());
      nest(body, place);
      blocks.end();
    }
    return true;
  }

  private boolean readTarget(RstLine line) {
    boolean target = RstSyntax.isMark(file, line, "__");
    if (target) {
      lines.takeContent(line);
    }
    return target;
  }

  /** A line of marks: above a title, or a mark between what is above and below. */
  private boolean readAdornment(RstLine line) {
    if (!RstSyntax.isAdornment(file, line)) {
      return false;
    }
    Optional<RstLine> title = lines.following(1).filter(next -> !next.isBlank());
    Optional<RstLine> under = lines.following(2).filter(next -> RstSyntax.isAdornment(file, next));
    char mark = file.charAt(line.start());
    if (title.isPresent()
        && under.filter(next -> file.charAt(next.start()) == mark).isPresent()
        && RstSyntax.fits(file, title.get(), line)
        && !RstSyntax.isAdornment(file, title.get())) {
      Span extent = new Span(line.start(), under.get().end());
      blocks.addTitle(place, mark + "above", title.get().span(), extent);
      lines.goTo(lines.at() + 3);
      return true;
    }
    boolean rule = RstSyntax.isRule(line);
    lines.goTo(lines.at() + (rule ? 1 : 0));
    return rule;
  }

  private void readText(RstLine line) {
    Optional<RstLine> next = lines.following(1).filter(below -> !below.isBlank());
    boolean deeper = lines.hasIndented();
    if (next.isPresent()
        && !deeper
        && RstSyntax.isAdornment(file, next.get())
        && RstSyntax.fits(file, line, next.get())) {
      Span extent = new Span(line.start(), next.get().end());
      String mark = file.substring(next.get().start(), next.get().start() + 1);
      blocks.addTitle(place, mark, line.span(), extent);
      lines.goTo(lines.at() + 2);
    } else if (deeper && !RstSyntax.announces(file, line) && attribution(line) < 0) {
      RstPlace item = place.item();
      blocks.add(item, List.of(line.span()), line.span());
      nest(lines.takeIndented(lines.at() + 1), item);
    } else {
      addParagraph(line);
    }
  }

  /**
   * Up to a blank line, or one that is indented; two colons at its end announce what is literal.
   */
  private void addParagraph(RstLine first) {
    int dash = attribution(first);
    int end = lines.at() + 1;
    while (lines.isText(end) && (dash >= 0 || depth == DEEPEST || !lines.isIndented(end))) {
      end++;
    }
    List<Span> words = new ArrayList<>();
    lines.all().subList(lines.at(), end).forEach(line -> words.add(line.span()));
    RstLine last = lines.all().get(end - 1);
    lines.goTo(end);
    boolean announces = RstSyntax.announces(file, last);
    if (announces) {
      words.set(words.size() - 1, RstSyntax.announced(file, last).span());
    }
    if (dash >= 0) {
      words.set(0, new Span(Math.min(dash, words.get(0).end()), words.get(0).end()));
    }
    words.removeIf(Span::isEmpty);
    blocks.add(place, words, new Span(first.start(), last.end()));
    if (announces) {
      lines.takeLiteral(file).ifPresent(blocks::addVerbatim);
    }
  }

  /** Offset behind the dashes before the name of who is quoted; -1 if the line is another. */
  private int attribution(RstLine line) {
    boolean last =
        place.kind() == Block.Kind.QUOTATION
            && lines.following(-1).filter(RstLine::isBlank).isPresent();
    return last ? RstSyntax.attribution(file, line) : -1;
  }

  private void addLines(List<Span> words, int start) {
    if (!words.isEmpty()) {
      blocks.add(place, words, new Span(start, words.get(words.size() - 1).end()));
    }
  }

  private void nest(List<RstLine> body, RstPlace inside) {
    RstLines.column(body)
        .ifPresent(column -> new RstBody(blocks, body, column, inside, depth + 1).read());
  }
}
