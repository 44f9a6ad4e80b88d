package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** The file formats, each with its extractor. */
public enum Format {
  /** Text without markup. */
  PLAIN(List.of("plaintext", "text"), "txt", "text"),
  /** CommonMark with tables, footnotes and what writers of documentation add. */
  MARKDOWN(List.of("markdown"), "md", "markdown", "mkd"),
  /** Markdown with tags and expressions of JavaScript. */
  MDX(List.of("mdx"), "mdx"),
  /** Subtitles as SubRip writes them. */
  SUBRIP(List.of("srt", "subrip"), "srt"),
  /** Subtitles as WebVTT has them. */
  WEBVTT(List.of("vtt", "webvtt"), "vtt"),
  /** HTML, also as XHTML. */
  HTML(List.of("html"), "html", "htm", "xhtml"),
  /** XML: DocBook, DITA, and others by what they say of themselves. */
  XML(List.of("xml", "docbook", "dita"), "xml", "dbk", "docbook", "dita", "ditamap"),
  /** AsciiDoc. */
  ASCIIDOC(List.of("asciidoc"), "adoc", "asciidoc", "asc"),
  /** LaTeX. */
  LATEX(List.of("latex", "tex", "plaintex"), "tex", "ltx"),
  /** reStructuredText. */
  RST(List.of("restructuredtext", "rst"), "rst", "rest");

  private final List<String> languages;
  private final List<String> extensions;

  Format(List<String> languages, String... extensions) {
    this.languages = languages;
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

  /** The format that an editor calls by a name, LSP's {@code languageId}; empty if none is. */
  public static Optional<Format> ofLanguage(String languageId) {
    return Arrays.stream(values())
        .filter(format -> format.languages.contains(languageId))
        .findFirst();
  }

  /** The extensions that mark a file as this format, without their dot. */
  public List<String> extensions() {
    return extensions;
  }

  /** All extensions, parted by commas as in a glob. */
  public static String everyExtension() {
    return Arrays.stream(values())
        .flatMap(format -> format.extensions.stream())
        .collect(Collectors.joining(","));
  }

  /**
   * The language that a file gives for itself: a tag as it stands there, possibly of no language.
   */
  public Optional<String> language(Text text) {
    return switch (this) {
      case PLAIN, MARKDOWN, MDX -> StatedLanguage.inFrontMatter(text);
      case ASCIIDOC -> StatedLanguage.inFrontMatter(text).or(() -> StatedLanguage.inAsciiDoc(text));
      case HTML -> StatedLanguage.inHtml(text);
      case XML -> StatedLanguage.inXml(text);
      case SUBRIP, WEBVTT, LATEX, RST -> Optional.empty();
    };
  }

  /**
   * The blocks of a file, in its order. Never fails: what cannot be read as markup is prose.
   *
   * @param text the file, possibly with a byte-order mark, which is no prose
   */
  public List<Block> blocks(Text text) {
    return blocks(text, FrontMatterKeys.USUAL);
  }

  /**
   * The same.
   *
   * @param keys whose values are prose, if the file has front matter
   */
  public List<Block> blocks(Text text, FrontMatterKeys keys) {
    return Placeholders.mark(text.string(), marked(text, keys));
  }

  /** The blocks with what the format itself marks in them. */
  private List<Block> marked(Text text, FrontMatterKeys keys) {
    return switch (this) {
      case PLAIN -> PlainText.blocks(text);
      case MARKDOWN -> Markdown.blocks(text, keys);
      case MDX -> Markdown.ofMdx(text, keys);
      case SUBRIP, WEBVTT -> Subtitles.blocks(text);
      case HTML -> Html.blocks(text);
      case XML -> Xml.blocks(text);
      case ASCIIDOC -> AsciiDoc.blocks(text, keys);
      case LATEX -> Latex.blocks(text);
      case RST -> Rst.blocks(text);
    };
  }

  /**
   * How whole the marks of a file are: equal before and after a change that breaks none. Formats
   * whose marks cannot be left open have none.
   */
  public Map<String, Integer> marks(Text text) {
    return this == HTML ? HtmlMarks.of(text) : Map.of();
  }

  /** Whether it is a format of subtitles, whose text has no place outside of a cue. */
  public boolean hasCues() {
    return this == SUBRIP || this == WEBVTT;
  }
}
