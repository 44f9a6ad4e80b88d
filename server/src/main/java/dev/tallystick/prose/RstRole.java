package dev.tallystick.prose;

import java.util.Arrays;
import java.util.Locale;
import java.util.Set;

/**
 * What interpreted text shows.
 *
 * @param name the role without its domain, in lower case
 * @param phrase whether it is no role but a reference to a phrase
 */
record RstRole(String name, boolean phrase) {
  /** Roles that show the title of what they point to, or a number. */
  private static final Set<String> LABELS =
      Set.of("ref", "doc", "numref", "eq", "cite", "footcite");

  /** Roles whose text may have angle brackets of its own. */
  private static final Set<String> LITERAL =
      Set.of("", "code", "kbd", "math", "samp", "literal", "raw", "sub", "sup", "subscript");

  /** Roles whose text is copied: code, keys, and the names that programs have for things. */
  private static final Set<String> CODE =
      Set.of(
          "code",
          "literal",
          "math",
          "kbd",
          "samp",
          "raw",
          "file",
          "command",
          "program",
          "option",
          "envvar",
          "func",
          "meth",
          "class",
          "mod",
          "attr",
          "data",
          "const",
          "exc",
          "obj",
          "regexp",
          "mimetype",
          "makevar",
          "token",
          "keyword",
          "pep",
          "rfc");

  static RstRole of(String name, boolean phrase) {
    String own = name.substring(name.lastIndexOf(':') + 1);
    String family = name.startsWith("cite:") ? "cite" : own;
    return new RstRole(family.toLowerCase(Locale.ROOT), phrase);
  }

  /** What its text is to a reader. */
  Inline.Kind kind() {
    if (CODE.contains(name) && !phrase) {
      return Inline.Kind.CODE;
    }
    return phrase || LABELS.contains(name) ? Inline.Kind.LINK : Inline.Kind.EMPHASIS;
  }

  /** Marks what of the text between two offsets is not shown: targets and signs for them. */
  void mark(String prose, boolean[] marks, int from, int to) {
    int target = LITERAL.contains(name) ? -1 : target(prose, from, to);
    if (target > from) {
      Arrays.fill(marks, target, to, true);
    } else if (target == from) {
      marks[from] = true;
      marks[to - 1] = true;
    } else if (!phrase && LABELS.contains(name)) {
      Arrays.fill(marks, from, to, true);
    }
    boolean sign = "~!".indexOf(prose.charAt(from)) >= 0;
    if (sign && !phrase && !LITERAL.contains(name)) {
      marks[from] = true;
    }
  }

  /** Where the blanks before a target in angle brackets begin; -1 if there is none. */
  private static int target(String prose, int from, int to) {
    if (prose.charAt(to - 1) != '>') {
      return -1;
    }
    int at = to - 1;
    while (at >= from && prose.charAt(at) != '<') {
      at--;
    }
    if (at < from || at > from && !Characters.isSpace(prose.charAt(at - 1))) {
      return -1;
    }
    while (at > from && Characters.isSpace(prose.charAt(at - 1))) {
      at--;
    }
    return at;
  }
}
