package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Predicate;

/** The file formats, each with its extractor. */
public enum Format {
  /** Text without markup. */
  PLAIN(List.of("txt", "text"), List.of("plaintext", "text")),
  /** CommonMark with tables. */
  MARKDOWN(List.of("md", "markdown", "mkd"), List.of("markdown"));

  private final List<String> extensions;
  private final List<String> languageIds;

  Format(List<String> extensions, List<String> languageIds) {
    this.extensions = extensions;
    this.languageIds = languageIds;
  }

  /** The format of a file by its name's extension; empty if it is none of ours. */
  public static Optional<Format> ofName(String fileName) {
    String name = fileName.substring(fileName.lastIndexOf('/') + 1);
    String extension = name.substring(name.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
    return find(format -> name.contains(".") && format.extensions.contains(extension));
  }

  /** The format by an editor's language id; empty if it is none of ours. */
  public static Optional<Format> ofLanguageId(String id) {
    return find(format -> format.languageIds.contains(id));
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

  private static Optional<Format> find(Predicate<Format> wanted) {
    for (Format format : values()) {
      if (wanted.test(format)) {
        return Optional.of(format);
      }
    }
    return Optional.empty();
  }
}
