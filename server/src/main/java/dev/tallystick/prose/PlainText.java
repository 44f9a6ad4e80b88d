package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * Text without markup. Blank lines and rules part groups of lines; within a group each line is a
 * block, or hard-wrapped lines are joined. Lists and headings are known by their customary looks.
 */
final class PlainText {
  private static final int LONGEST_HEADING = 80;

  private final String file;
  private final List<Line> lines;
  private final Wrapping wrapping;
  private final List<Block> blocks = new ArrayList<>();

  private PlainText(Text text) {
    this.file = text.string();
    this.lines = Line.all(text);
    this.wrapping = Wrapping.of(file, lines);
  }

  static List<Block> blocks(Text text) {
    PlainText plain = new PlainText(text);
    plain.readGroups();
    return List.copyOf(plain.blocks);
  }

  private void readGroups() {
    int from = 0;
    while (from < lines.size()) {
      int to = from;
      while (to < lines.size() && lines.get(to).isProse()) {
        to++;
      }
      if (to - from == 1 && isUnderlined(from)) {
        addUnderlined(lines.get(from), lines.get(to));
      } else if (to > from) {
        List<Line> group = lines.subList(from, to);
        new PlainGroup(file, group, wrappingOf(group)).addTo(blocks);
      }
      from = to + 1;
    }
  }

  /** The file decides; a group that clearly differs decides for itself. */
  private Wrapping wrappingOf(List<Line> group) {
    if (wrapping.isWrapped()) {
      return wrapping.isRagged(file, group) ? new Wrapping(0, 0) : wrapping;
    }
    Wrapping own = Wrapping.of(file, group);
    return own.pairs() >= 4 ? own : new Wrapping(0, 0);
  }

  private boolean isUnderlined(int title) {
    if (title + 1 == lines.size()) {
      return false;
    }
    Line above = lines.get(title);
    Line below = lines.get(title + 1);
    int length = below.end() - below.start();
    char mark = below.isRule() ? file.charAt(below.start()) : ' ';
    return (mark == '=' || mark == '-')
        && file.substring(below.start(), below.end()).chars().allMatch(c -> c == mark)
        && length >= 3
        && length * 2 >= above.width() - above.indent()
        && above.width() <= LONGEST_HEADING;
  }

  private void addUnderlined(Line title, Line underline) {
    int level = file.charAt(underline.start()) == '=' ? 1 : 2;
    PlainBlock block = new PlainBlock(file, Block.Kind.HEADING, level, title.start());
    block.append(title.start(), title.end());
    blocks.add(block.build(underline.end()));
  }
}
