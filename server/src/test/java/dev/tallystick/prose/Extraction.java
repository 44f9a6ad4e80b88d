package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/** Shows what an extractor makes of a text, in forms that a test can spell out. */
final class Extraction {
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private Extraction() {}

  /**
   * Checks a table of lines: under each line of the file its mask, which has a {@code ·} for every
   * character that is no prose. A blank line has no mask. The same must come out with other line
   * ends and with a byte-order mark.
   */
  static void assertMask(Format format, String table) {
    StringBuilder source = new StringBuilder();
    StringBuilder mask = new StringBuilder();
    String[] lines = table.split("\n");
    for (int i = 0; i < lines.length; i++) {
      source.append(lines[i]).append('\n');
      mask.append(lines[i].isEmpty() ? "" : lines[++i]).append('\n');
    }
    assertVariants(format, source.toString(), mask.toString());
  }

  private static void assertVariants(Format format, String source, String mask) {
    assertEquals(mask, mask(format, source));
    for (String lineEnd : List.of("\r\n", "\r")) {
      assertEquals(mask.replace("\n", lineEnd), mask(format, source.replace("\n", lineEnd)));
    }
    assertEquals("·" + mask, mask(format, BYTE_ORDER_MARK + source));
    String last = source.substring(0, source.length() - 1);
    assertEquals(mask.substring(0, last.length()), mask(format, last), "without a last line end");
  }

  /** Checks the list of blocks: kind, level unless 0, and the prose with a {@code ⏎} for breaks. */
  static void assertBlocks(Format format, String source, String expected) {
    assertEquals(expected, blocks(format, source));
    String windows = source.replace("\n", "\r\n");
    assertEquals(expected.replace("⏎", "⏎⏎"), blocks(format, windows), "with CR LF");
  }

  /** Checks the stretches that the blocks take up, one a line, with a {@code ⏎} for breaks. */
  static void assertExtents(Format format, String source, String expected) {
    String extents =
        format.blocks(new Text(source)).stream()
            .map(block -> visible(block.extent().of(source)) + "\n")
            .collect(Collectors.joining());
    assertEquals(expected, extents);
  }

  private static String mask(Format format, String source) {
    char[] mask = new char[source.length()];
    Arrays.fill(mask, '·');
    for (Block block : format.blocks(new Text(source))) {
      for (Span piece : block.pieces()) {
        source.getChars(piece.start(), piece.end(), mask, piece.start());
      }
    }
    for (int i = 0; i < mask.length; i++) {
      char c = source.charAt(i);
      mask[i] = c == '\n' || c == '\r' ? c : mask[i];
    }
    return new String(mask);
  }

  static String blocks(Format format, String source) {
    return format.blocks(new Text(source)).stream()
        .map(block -> describe(block, source))
        .collect(Collectors.joining());
  }

  private static String describe(Block block, String source) {
    String level = block.level() == 0 ? "" : " " + block.level();
    String prose = visible(block.prose(source));
    return block.kind() + level + (prose.isEmpty() ? "" : ": " + prose) + "\n";
  }

  private static String visible(String text) {
    return text.replace('\n', '⏎').replace('\r', '⏎');
  }
}
