package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jsoup.nodes.Entities;

/**
 * What is copied in the prose of any format, and known by its looks: places for values as templates
 * and programs write them, references to characters, addresses. Their syntax is from memory.
 */
final class Placeholders {
  /** All of them begin with one of these, but for addresses, which have one of the others. */
  private static final String SIGNS = "{%$<&" + ":@";

  /** {@code {{ x }}}, {@code {% x %}}, {@code ${x}}, {@code {x}}, {@code %{x}}, {@code {}}. */
  private static final String BRACES =
      "\\{\\{[^{}]{0,80}+\\}\\}|\\{%[^{}%]{0,80}+%\\}|\\$\\{[^{}\\s]{1,80}+\\}"
          + "|%?+\\{[\\w.:#-]{0,60}+\\}";

  /** {@code %s}, {@code %1$d}, {@code %-8.2f}, {@code %(x)s}. */
  private static final String PERCENT =
      "(?<![\\d%])%(?:\\(\\w{1,60}+\\)|\\d{1,2}+\\$)?+[-+0#]*+\\d{0,3}+(?:\\.\\d{1,2}+)?+(?:ll?|h|z)?"
          + "[sdiufxXc@](?![\\p{L}\\d])";

  /** {@code <0>}, {@code </0>}, {@code <0/>}. */
  private static final String NUMBERED = "</?+\\d{1,3}+ ?+/?+>";

  private static final String REFERENCE =
      "&(?:#\\d{1,7}+|#[xX][\\da-fA-F]{1,6}+|[A-Za-z][\\w.-]{1,40}+);";

  /** No blank, no quotation mark, and no letter of a script that writes none between words. */
  private static final String IN_ADDRESS =
      "[\\p{L}\\p{N}\\p{M}._~:/?#@!$&'()*+,;=%\\[\\]|{}\\-"
          + "&&[^\\p{IsHan}\\p{IsHiragana}\\p{IsKatakana}\\p{IsThai}\\p{IsLao}\\p{IsKhmer}"
          + "\\p{IsMyanmar}]]";

  private static final Pattern VALUE =
      Pattern.compile(BRACES + "|" + PERCENT + "|" + NUMBERED + "|" + REFERENCE);

  private static final Pattern ADDRESS =
      Pattern.compile(
          "(?<![\\w.+-])(?:(?:https?|ftps?|file|git|ssh|ircs?)://"
              + IN_ADDRESS
              + "++|(?:mailto:)?+[\\w.+-]{1,64}+@[\\p{L}\\d-]{1,63}+(?:\\.[\\p{L}\\d-]{1,63}+)++)");

  /** Marks that rather close the sentence around an address than belong to it. */
  private static final String TRAILING = ".,:;!?'";

  private Placeholders() {}

  /** The block with what is copied in its prose, but for what is marked as copied anyhow. */
  static Block mark(String file, Block block) {
    if (block.pieces().isEmpty()) {
      return block;
    }
    String prose = block.prose(file);
    if (!maySay(prose)) {
      return block;
    }
    Offsets offsets = new Offsets(block.pieces());
    List<Inline> found = new ArrayList<>();
    int end = 0;
    Matcher address = ADDRESS.matcher(prose);
    Matcher value = VALUE.matcher(prose);
    boolean addresses = prose.contains("://") || prose.indexOf('@') >= 0;
    while (addresses && address.find()) {
      addValues(found, offsets, value.region(end, address.start()));
      end = addressEnd(prose, address.start(), address.end());
      found.add(new Inline(Inline.Kind.ADDRESS, offsets.inFile(new Span(address.start(), end))));
    }
    addValues(found, offsets, value.region(end, prose.length()));
    return block.with(outside(block.inlines(), found));
  }

  /** Whether there is a sign of one at all: nearly all of most texts has none. */
  private static boolean maySay(String prose) {
    for (int i = 0; i < prose.length(); i++) {
      char c = prose.charAt(i);
      if (c <= '{' && SIGNS.indexOf(c) >= 0) {
        return true;
      }
    }
    return false;
  }

  private static void addValues(List<Inline> found, Offsets offsets, Matcher value) {
    while (value.find()) {
      Span span = offsets.inFile(new Span(value.start(), value.end()));
      found.add(new Inline(kind(value.group()), span));
    }
  }

  private static Inline.Kind kind(String value) {
    boolean known =
        value.startsWith("&")
            && (value.startsWith("&#")
                || Entities.isNamedEntity(value.substring(1, value.length() - 1)));
    return known ? Inline.Kind.REFERENCE : Inline.Kind.PLACEHOLDER;
  }

  /** Without the marks behind it, and without a bracket that was opened before it. */
  private static int addressEnd(String prose, int start, int end) {
    int depth = 0;
    for (int i = start; i < end; i++) {
      depth += bracket(prose.charAt(i));
    }
    int to = end;
    while (TRAILING.indexOf(prose.charAt(to - 1)) >= 0
        || depth < 0 && bracket(prose.charAt(to - 1)) < 0) {
      depth -= bracket(prose.charAt(to - 1));
      to--;
    }
    return to;
  }

  private static int bracket(char c) {
    return switch (c) {
      case '(', '[', '{' -> 1;
      case ')', ']', '}' -> -1;
      default -> 0;
    };
  }

  /** Those that do not lie in one that is copied already. Both lists are in order. */
  private static List<Inline> outside(List<Inline> marked, List<Inline> found) {
    List<Inline> outside = new ArrayList<>();
    int next = 0;
    int copiedTo = 0;
    for (Inline inline : found) {
      while (next < marked.size() && marked.get(next).span().start() <= inline.span().start()) {
        Inline before = marked.get(next++);
        copiedTo = before.kind().isCopied() ? Math.max(copiedTo, before.span().end()) : copiedTo;
      }
      if (inline.span().end() > copiedTo) {
        outside.add(inline);
      }
    }
    return outside;
  }
}
