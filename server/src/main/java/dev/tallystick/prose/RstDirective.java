package dev.tallystick.prose;

import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A directive, known by its name: those of docutils, of Sphinx, and some that are often added.
 *
 * @param name without its domain, in lower case
 * @param arguments the rest of its first line
 */
record RstDirective(String name, RstLine arguments) {
  private static final Set<String> VERBATIM =
      Set.of(
          "code",
          "code-block",
          "sourcecode",
          "literalinclude",
          "parsed-literal",
          "math",
          "raw",
          "graphviz",
          "digraph",
          "graph",
          "mermaid",
          "uml",
          "plantuml",
          "doctest",
          "testcode",
          "testoutput",
          "testsetup",
          "testcleanup",
          "productionlist",
          "prompt",
          "ipython",
          "jupyter-execute",
          "plot");

  private static final Set<String> SILENT =
      Set.of(
          "toctree",
          "index",
          "contents",
          "include",
          "bibliography",
          "autosummary",
          "role",
          "default-role",
          "unicode",
          "date",
          "tabularcolumns",
          "sectnum",
          "meta");

  /** Those whose words may begin on the first line and go on below. */
  private static final Set<String> NOTES =
      Set.of(
          "note",
          "warning",
          "attention",
          "caution",
          "danger",
          "error",
          "hint",
          "important",
          "tip",
          "seealso",
          "todo",
          "compound",
          "header",
          "footer",
          "impl-detail",
          "line-block",
          "replace");

  private static final Set<String> QUOTATIONS = Set.of("epigraph", "highlights", "pull-quote");

  private static final Set<String> TITLED =
      Set.of(
          "admonition",
          "topic",
          "sidebar",
          "rubric",
          "centered",
          "title",
          "table",
          "list-table",
          "csv-table",
          "dropdown",
          "details",
          "collapse",
          "tab",
          "tab-item",
          "card",
          "grid-item-card");

  /** Those that tell versions first, and how many. */
  private static final Map<String, Integer> VERSIONED =
      Map.of(
          "versionadded", 1,
          "versionchanged", 1,
          "versionremoved", 1,
          "deprecated", 1,
          "deprecated-removed", 2);

  private static final Set<String> FACTS =
      Set.of(
          "author",
          "authors",
          "contact",
          "version",
          "revision",
          "status",
          "date",
          "organization",
          "address",
          "orphan",
          "tocdepth",
          "nocomments",
          "nosearch",
          "type",
          "rtype",
          "vartype");

  private static final Pattern LABEL =
      Pattern.compile("\\[(?:\\d++|#[\\w.+:-]*+|\\*|\\w[\\w.+:-]*+)](?:[ \\t]++|$)");

  /** What its words are. */
  enum Kind {
    VERBATIM,
    SILENT,
    NOTE,
    QUOTATION,
    TITLED,
    VERSIONED,
    /** What stands on its first lines is for the program, what is below is prose. */
    OTHER
  }

  /** The directive that the text behind two dots is; a substitution may be one, too. */
  static Optional<RstDirective> of(String file, RstLine rest) {
    RstLine line = substitution(file, rest);
    int end = RstSyntax.nameEnd(file, line.start(), line.end());
    int colons = end < line.end() && file.charAt(end) == ' ' ? end + 1 : end;
    int behind = colons + 2;
    if (end == line.start() || behind > line.end() || !file.startsWith("::", colons)) {
      return Optional.empty();
    }
    if (behind < line.end() && !Characters.isBlank(file.charAt(behind))) {
      return Optional.empty();
    }
    String full = file.substring(line.start(), end).toLowerCase(Locale.ROOT);
    String own = full.substring(full.lastIndexOf(':') + 1);
    return Optional.of(new RstDirective(own, line.behind(file, behind)));
  }

  /** The definition of a substitution without the name that it is for. */
  private static RstLine substitution(String file, RstLine rest) {
    if (!file.startsWith("|", rest.start()) || rest.isBlank()) {
      return rest;
    }
    int close = rest.start() + 1;
    while (close < rest.end() && file.charAt(close) != '|') {
      close++;
    }
    return close < rest.end() ? rest.behind(file, close + 1) : rest;
  }

  /** Offset behind the label of a footnote or a book; -1 if there is none. */
  static int behindNoteLabel(String file, RstLine rest) {
    Matcher label = LABEL.matcher(file).region(rest.start(), rest.end());
    return label.lookingAt() ? label.end() : -1;
  }

  /** Whether a field of this name holds a fact and no prose. */
  static boolean isFact(String field) {
    String name = field.toLowerCase(Locale.ROOT);
    return FACTS.contains(name) || name.startsWith("type ") || name.startsWith("vartype ");
  }

  Kind kind() {
    if (VERBATIM.contains(name)) {
      return Kind.VERBATIM;
    }
    if (SILENT.contains(name)) {
      return Kind.SILENT;
    }
    if (NOTES.contains(name)) {
      return Kind.NOTE;
    }
    if (QUOTATIONS.contains(name)) {
      return Kind.QUOTATION;
    }
    if (TITLED.contains(name)) {
      return Kind.TITLED;
    }
    return VERSIONED.containsKey(name) ? Kind.VERSIONED : Kind.OTHER;
  }

  /** Whether the value of one of its options is shown to readers. */
  boolean shows(String option) {
    return name.equals("meta")
        ? option.startsWith("description") || option.startsWith("keywords")
        : option.equals("alt") || option.equals("caption") || option.equals("subtitle");
  }

  /** How many words come before its prose. */
  int versions() {
    return VERSIONED.getOrDefault(name, 0);
  }

  boolean isList() {
    return name.equals("list-table");
  }

  boolean isValues() {
    return name.equals("csv-table");
  }
}
