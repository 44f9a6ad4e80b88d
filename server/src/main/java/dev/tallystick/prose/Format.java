package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The file formats, each with its extractor. */
public enum Format {
  /** Text without markup. */
  PLAIN("txt", "text"),
  /** CommonMark with tables. */
  MARKDOWN("md", "markdown", "mkd");

  private final List<String> extensions;

  Format(String... extensions) {
    this.extensions = List.of(extensions);
  }

  /** The format of a file by its name's extension; empty if it is none of ours. */
  public static Optional<Format> ofName(String fileName) {
    String name = fileName.substring(fileName.lastIndexOf('/') + 1);
    String extension = name.substring(name.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
    return Arrays.stream(values())
        .filter(format -> name.contains(".") && format.extensions.contains(extension))
        .findFirst();
  }

  /** The extensions that mark a file as this format, without their dot. */
  public List<String> extensions() {
    return extensions;
  }

  /**
   * The blocks of a file, in its order. Never fails: what cannot be read as markup is prose.
   *
   * @param text the file, possibly with a byte-order mark, which is no prose
   */
  public List<Block> blocks(Text text) {
    return switch (this) {
      case PLAIN -> PlainText.blocks(text);
      case MARKDOWN -> Markdown.blocks(text);
    };
  }
}
