package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * Text without markup. Blank lines and rules part groups of lines; within a group each line is a
 * block, or hard-wrapped lines are joined. Lists and headings are known by their customary looks,
 * and what a letter quotes by the marks that programs for mail put before each line.
 */
final class PlainText {
  private static final int LONGEST_HEADING = 80;

  /** Each line stands for itself. */
  private static final Wrapping NONE = new Wrapping(0, 0);

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
      while (to < lines.size() && isInGroup(from, to)) {
        to++;
      }
      if (to - from == 1 && isUnderlined(from)) {
        addUnderlined(lines.get(from), lines.get(to));
      } else if (to > from) {
        List<Line> group = lines.subList(from, to);
        boolean signature = from > 0 && lines.get(from - 1).opensSignature(file);
        new PlainGroup(file, group, signature ? NONE : wrappingOf(group)).addTo(blocks);
      }
      from = to < lines.size() && lines.get(to).isProse() ? to : to + 1;
    }
  }

  private boolean isInGroup(int first, int i) {
    return lines.get(i).isProse() && lines.get(i).isBeside(lines.get(first));
  }

  /** The file decides; a group that clearly differs decides for itself. */
  private Wrapping wrappingOf(List<Line> group) {
    if (wrapping.isWrapped()) {
      return wrapping.isRagged(file, group) ? NONE : wrapping;
    }
    Wrapping own = Wrapping.of(file, group);
    return own.pairs() >= 4 ? own : NONE;
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
        && above.isBeside(below)
        && length * 2 >= above.width() - above.indent()
        && above.width() <= LONGEST_HEADING;
  }

  private void addUnderlined(Line title, Line underline) {
    int level = file.charAt(underline.start()) == '=' ? 1 : 2;
    PlainBlock block = new PlainBlock(file, Block.Kind.HEADING, level, title.mark());
    block.append(title.start(), title.end());
    blocks.add(block.build(underline.end()));
  }
}
