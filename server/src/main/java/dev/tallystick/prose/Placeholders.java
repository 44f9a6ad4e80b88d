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

  /** Patterns take time to make, and most texts need none. */
  private static final class Value {
    static final Pattern PATTERN =
        Pattern.compile(BRACES + "|" + PERCENT + "|" + NUMBERED + "|" + REFERENCE);
  }

  private static final class Address {
    static final Pattern PATTERN =
        Pattern.compile(
            "(?<![\\w.+-])(?:(?:https?|ftps?|file|git|ssh|ircs?)://"
                + IN_ADDRESS
                + "++|(?:mailto:)?+[\\w.+-]{1,64}+@[\\p{L}\\d-]{1,63}+"
                + "(?:\\.[\\p{L}\\d-]{1,63}+)++)");
  }

  /** Marks that rather close the sentence around an address than belong to it. */
  private static final String TRAILING = ".,:;!?'";

  private Placeholders() {}

  /** The blocks with what is copied in their prose, but for what is marked as copied anyhow. */
  static List<Block> mark(String file, List<Block> blocks) {
    if (!mayHaveValues(file) && !mayHaveAddresses(file)) {
      return blocks;
    }
    List<Block> marked = new ArrayList<>(blocks.size());
    for (Block block : blocks) {
      marked.add(block.pieces().isEmpty() ? block : mark(block, block.prose(file)));
    }
    return List.copyOf(marked);
  }

  private static Block mark(Block block, String prose) {
    boolean addresses = mayHaveAddresses(prose);
    boolean values = mayHaveValues(prose);
    if (!addresses && !values) {
      return block;
    }
    List<Inline> found = new ArrayList<>();
    Offsets offsets = new Offsets(block.pieces());
    int end = 0;
    if (addresses) {
      Matcher address = Address.PATTERN.matcher(prose);
      while (address.find()) {
        if (values) {
          addValues(found, offsets, prose, end, address.start());
        }
        end = addressEnd(prose, address.start(), address.end());
        found.add(new Inline(Inline.Kind.ADDRESS, offsets.inFile(new Span(address.start(), end))));
      }
    }
    if (values) {
      addValues(found, offsets, prose, end, prose.length());
    }
    return found.isEmpty() ? block : block.with(outside(block.inlines(), found));
  }

  private static boolean mayHaveValues(String text) {
    return text.indexOf('{') >= 0
        || text.indexOf('%') >= 0
        || text.indexOf('<') >= 0
        || text.indexOf('&') >= 0;
  }

  private static boolean mayHaveAddresses(String text) {
    return text.indexOf('@') >= 0 || text.contains("://");
  }

  private static void addValues(
      List<Inline> found, Offsets offsets, String prose, int from, int to) {
    Matcher value = Value.PATTERN.matcher(prose).region(from, to);
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
