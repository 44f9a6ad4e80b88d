package dev.tallystick.prose;

import dev.tallystick.text.Scripts;
import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Addresses of pages and mailboxes in running text. */
final class Addresses {
  private static final String BEHIND_SCHEME = "://";
  private static final String MAIL = "mailto:";
  private static final int LONGEST_NAME = 64;

  private static final Set<String> SCHEMES =
      Set.of("http", "https", "ftp", "ftps", "file", "git", "ssh", "irc", "ircs");

  /** What is printed in ASCII, and no part of the address of a page. */
  private static final String NOT_IN_PAGE = "\"<>^`";

  /** Marks that rather close the sentence around an address than belong to it. */
  private static final String TRAILING = ".,:;!?'";

  private Addresses() {}

  /** Patterns take time to make, and most texts need none. */
  private static final class Mailbox {
    static final Pattern PATTERN =
        Pattern.compile(
            "(?:mailto:)?+[\\w.+-]{1,64}+@[\\p{L}\\d-]{1,63}+(?:\\.[\\p{L}\\d-]{1,63}+)++");
  }

  /** Whether there can be any. */
  static boolean mayBeIn(String text) {
    return text.indexOf('@') >= 0 || text.contains(BEHIND_SCHEME);
  }

  /** Those of a text, in order. */
  static List<Span> in(String text) {
    List<Span> found = new ArrayList<>();
    if (!mayBeIn(text)) {
      return found;
    }
    int end = 0;
    int scheme = text.indexOf(BEHIND_SCHEME);
    int at = text.indexOf('@');
    while (scheme >= 0 || at >= 0) {
      boolean page = at < 0 || scheme >= 0 && scheme < at;
      int sign = page ? scheme : at;
      int start = page ? schemeStart(text, end, sign) : nameStart(text, end, sign);
      int last = page ? pageEnd(text, start, sign) : mailboxEnd(text, start);
      boolean begins = start == 0 || !isInName(text.charAt(start - 1));
      int next = sign + 1;
      if (last > 0 && begins) {
        end = addressEnd(text, start, last);
        found.add(new Span(start, end));
        next = Math.max(next, end);
      }
      scheme = scheme >= 0 && scheme < next ? text.indexOf(BEHIND_SCHEME, next) : scheme;
      at = at >= 0 && at < next ? text.indexOf('@', next) : at;
    }
    return found;
  }

  /** The place behind the address of a page; 0 if it is none. */
  private static int pageEnd(String text, int start, int sign) {
    int first = sign + BEHIND_SCHEME.length();
    int end = first;
    if (SCHEMES.contains(text.substring(start, sign))) {
      while (end < text.length() && isInPage(text.codePointAt(end))) {
        end += Character.charCount(text.codePointAt(end));
      }
    }
    return end > first ? end : 0;
  }

  /** No blank, no quotation mark, and no letter of a script that writes none between words. */
  private static boolean isInPage(int c) {
    return c < 0x7F
        ? c > ' ' && NOT_IN_PAGE.indexOf(c) < 0
        : (Character.isLetterOrDigit(c) || Character.getType(c) == Character.NON_SPACING_MARK)
            && !Scripts.isUnspaced(c);
  }

  private static int mailboxEnd(String text, int start) {
    Matcher mailbox = Mailbox.PATTERN.matcher(text).region(start, text.length());
    return mailbox.lookingAt() ? mailbox.end() : 0;
  }

  private static int schemeStart(String text, int from, int sign) {
    int start = sign;
    while (start > from && text.charAt(start - 1) >= 'a' && text.charAt(start - 1) <= 'z') {
      start--;
    }
    return start;
  }

  private static int nameStart(String text, int from, int sign) {
    int start = sign;
    while (start > from && sign - start < LONGEST_NAME && isInName(text.charAt(start - 1))) {
      start--;
    }
    int mail = start - MAIL.length();
    return mail >= from && text.startsWith(MAIL, mail) ? mail : start;
  }

  private static boolean isInName(char c) {
    return c >= 'a' && c <= 'z'
        || c >= 'A' && c <= 'Z'
        || c >= '0' && c <= '9'
        || c == '.'
        || c == '_'
        || c == '+'
        || c == '-';
  }

  /** Without the marks behind it, and without a bracket that was opened before it. */
  private static int addressEnd(String text, int start, int end) {
    int depth = 0;
    for (int i = start; i < end; i++) {
      depth += bracket(text.charAt(i));
    }
    int to = end;
    while (TRAILING.indexOf(text.charAt(to - 1)) >= 0
        || depth < 0 && bracket(text.charAt(to - 1)) < 0) {
      depth -= bracket(text.charAt(to - 1));
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
}
