package dev.tallystick.prose;

import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What the lines in brackets before a block say of it.
 *
 * @param name its style, in lower case; empty if none is given
 * @param commaSeparated whether a table's cells are parted by commas
 */
record AsciiDocStyle(String name, boolean commaSeparated) {
  static final AsciiDocStyle NONE = new AsciiDocStyle("", false);

  private static final Set<String> VERBATIM =
      Set.of(
          "source",
          "listing",
          "literal",
          "pass",
          "stem",
          "latexmath",
          "asciimath",
          "plantuml",
          "ditaa",
          "graphviz",
          "mermaid",
          "blockdiag",
          "seqdiag",
          "vega",
          "svgbob",
          "a2s");
  private static final Set<String> QUOTATION = Set.of("quote", "verse");
  private static final Pattern STYLE = Pattern.compile("\\[([A-Za-z][\\w-]*+)(?!=)");
  private static final Pattern COMMAS = Pattern.compile("format=\"?csv");

  /** The same with one more line in brackets. */
  AsciiDocStyle and(String line) {
    Matcher style = STYLE.matcher(line);
    boolean given = style.lookingAt();
    return new AsciiDocStyle(
        given ? style.group(1) : name, commaSeparated || COMMAS.matcher(line).find());
  }

  boolean isVerbatim() {
    return VERBATIM.contains(name);
  }

  boolean isComment() {
    return name.equals("comment");
  }

  boolean isQuotation() {
    return QUOTATION.contains(name);
  }

  /** Whether lines that begin with a blank are prose all the same. */
  boolean isProse() {
    return name.equals("normal") || isQuotation();
  }
}
