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

  /** Patterns take time to make, and most texts need none. */
  private static final class Value {
    static final Pattern PATTERN =
        Pattern.compile(BRACES + "|" + PERCENT + "|" + NUMBERED + "|" + REFERENCE);
  }

  private Placeholders() {}

  /** The blocks with what is copied in their prose, but for what is marked as copied anyhow. */
  static List<Block> mark(String file, List<Block> blocks) {
    if (!mayHaveValues(file) && !Addresses.mayBeIn(file)) {
      return blocks;
    }
    List<Block> marked = new ArrayList<>(blocks.size());
    for (Block block : blocks) {
      marked.add(block.pieces().isEmpty() ? block : mark(block, block.prose(file)));
    }
    return List.copyOf(marked);
  }

  private static Block mark(Block block, String prose) {
    List<Span> addresses = Addresses.in(prose);
    if (addresses.isEmpty() && !mayHaveValues(prose)) {
      return block;
    }
    List<Inline> found = new ArrayList<>();
    Offsets offsets = new Offsets(block.pieces());
    Matcher value = Value.PATTERN.matcher(prose).useTransparentBounds(true);
    int end = 0;
    for (Span address : addresses) {
      addValues(found, offsets, value, prose, new Span(end, address.start()));
      found.add(new Inline(Inline.Kind.ADDRESS, offsets.inFile(address)));
      end = address.end();
    }
    addValues(found, offsets, value, prose, new Span(end, prose.length()));
    return found.isEmpty() ? block : block.with(outside(block.inlines(), found));
  }

  private static boolean mayHaveValues(String text) {
    return text.indexOf('{') >= 0
        || text.indexOf('%') >= 0
        || text.indexOf('<') >= 0
        || text.indexOf('&') >= 0;
  }

  private static void addValues(
      List<Inline> found, Offsets offsets, Matcher value, String prose, Span within) {
    int at = within.start();
    while (at < within.end()) {
      char c = prose.charAt(at);
      boolean sign = c == '{' || c == '%' || c == '<' || c == '&' || c == '$';
      if (sign && value.region(at, within.end()).lookingAt()) {
        Span span = offsets.inFile(new Span(at, value.end()));
        found.add(new Inline(kind(value.group()), span));
        at = value.end();
      } else {
        at++;
      }
    }
  }

  private static Inline.Kind kind(String value) {
    boolean known =
        value.startsWith("&")
            && (value.startsWith("&#")
                || Entities.isNamedEntity(value.substring(1, value.length() - 1)));
    return known ? Inline.Kind.REFERENCE : Inline.Kind.PLACEHOLDER;
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
