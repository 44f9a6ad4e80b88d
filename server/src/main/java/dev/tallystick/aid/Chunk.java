package dev.tallystick.aid;

import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Lines that become blocks of their own in the translation.
 *
 * @param lines without the end of the last one
 * @param first index of the first source segment in them
 * @param last index of the last one
 */
record Chunk(String lines, int first, int last) {
  /** What stands between two blocks and belongs to neither: blank lines, also quoted ones. */
  static final String BLANK = "[ \\t>]*";

  /** Makes lines of blocks and of parts of blocks; whole ones that follow each other stay so. */
  static List<Chunk> of(List<Group> groups, Copy copy, String lineEnd) {
    List<Chunk> chunks = new ArrayList<>();
    for (int i = 0; i < groups.size(); i++) {
      Group from = groups.get(i);
      if (!from.isWhole()) {
        chunks.add(part(from, copy));
        continue;
      }
      while (i + 1 < groups.size()
          && groups.get(i + 1).isWhole()
          && groups.get(i + 1).first() == groups.get(i).last() + 1) {
        i++;
      }
      chunks.add(whole(copy.source(), from.first(), groups.get(i).last(), lineEnd));
    }
    return chunks;
  }

  /** The lines as they stand in the source. */
  private static Chunk whole(Reading source, int first, int last, String lineEnd) {
    Text text = source.text();
    int from = text.lineStart(firstLine(source, first));
    int to = text.lineEnd(lastLine(source, last));
    String lines = text.string().substring(from, to).replaceFirst("^\uFEFF", "");
    return new Chunk(lines.replaceAll("\\r\\n|[\\r\\n]", lineEnd), first, last);
  }

  /** Some sentences of a block, with the block's marks. */
  private static Chunk part(Group group, Copy copy) {
    String marks = Marks.first(group.source().text(), group.block()).replaceFirst("^\uFEFF", "");
    String words = group.segments().stream().map(copy::of).collect(Collectors.joining(" "));
    return new Chunk(marks + words, group.first(), group.last());
  }

  /** The blank lines before it in the source; none at its start. */
  List<String> blankBefore(Reading source) {
    return first == 0 ? List.of() : blankBetween(source, first - 1, first);
  }

  /** The blank lines behind it in the source; none at its end. */
  List<String> blankBehind(Reading source) {
    return last + 1 == source.segments().size() ? List.of() : blankBetween(source, last, last + 1);
  }

  private static List<String> blankBetween(Reading source, int one, int other) {
    Text text = source.text();
    List<String> blank = new ArrayList<>();
    for (int line = lastLine(source, one) + 1; line < firstLine(source, other); line++) {
      String words = text.string().substring(text.lineStart(line), text.lineEnd(line));
      if (words.matches(BLANK)) {
        blank.add(words);
      }
    }
    return blank;
  }

  /** The line that the block of a segment begins on. */
  static int firstLine(Reading reading, int segment) {
    return reading.text().place(reading.segments().get(segment).block().extent().start()).line();
  }

  /** The line that the block of a segment ends on; for a note, the block that it stands in. */
  static int lastLine(Reading reading, int segment) {
    int line = lastLine(reading, reading.segments().get(segment).block());
    for (int i = segment; i > 0 && isNote(reading, i); i--) {
      line = Math.max(line, lastLine(reading, reading.segments().get(i - 1).block()));
    }
    return line;
  }

  private static int lastLine(Reading reading, Block block) {
    int behind = block.extent().end();
    return reading.text().place(Math.max(block.extent().start(), behind - 1)).line();
  }

  private static boolean isNote(Reading reading, int segment) {
    return reading.segments().get(segment).block().kind() == Block.Kind.NOTE;
  }
}
