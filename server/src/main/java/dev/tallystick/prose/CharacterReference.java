package dev.tallystick.prose;

import java.nio.charset.Charset;
import java.text.Normalizer;
import java.util.Set;
import java.util.function.IntPredicate;
import org.jsoup.nodes.Entities;

/**
 * A character reference in HTML or XML, such as {@code &nbsp;} or {@code &#228;}. It cannot be
 * decoded, as all prose is characters of the file; so one of its own characters stands for it, the
 * likest one, and length, words and borders of sentences come out as if it were the character
 * itself.
 *
 * @param start offset of its ampersand
 * @param end offset behind it
 * @param character the code point that it stands for, the first one if there are several
 */
record CharacterReference(int start, int end, int character) {
  private static final int LONGEST_NAME = 32;
  private static final int LONGEST_NUMBER = 8;
  private static final int LONGEST_ENTITY = 200;
  private static final int REPLACEMENT = 0xFFFD;

  /** Double-struck letters, behind which number forms, arrows and common operators come. */
  private static final int RARE_LETTERS = 0x2145;

  private static final int NUMBER_FORMS = 0x2150;
  private static final int RARE_SIGNS = 0x2300;
  private static final Charset WINDOWS = Charset.forName("windows-1252");

  /**
   * The reference that starts at an ampersand; {@code null} if it is only an ampersand.
   *
   * @param limit offset behind the text or the value of the attribute
   * @param attribute whether it is in the value of an attribute, where fewer are known without a
   *     semicolon
   */
  static CharacterReference at(String file, int start, int limit, boolean attribute) {
    if (start + 1 < limit && file.charAt(start + 1) == '#') {
      return numeric(file, start, limit);
    }
    return named(file, start, limit, attribute);
  }

  /** HTML, 13.2.5.73, named character reference state. */
  private static CharacterReference named(String file, int start, int limit, boolean attribute) {
    int first = start + 1;
    int end = first;
    while (end < limit && end - first < LONGEST_NAME && isAlphanumeric(file.charAt(end))) {
      end++;
    }
    String name = file.substring(first, end);
    if (end < limit && file.charAt(end) == ';' && Entities.isNamedEntity(name)) {
      return new CharacterReference(start, end + 1, Entities.getByName(name).codePointAt(0));
    }
    String known = Entities.findPrefix(name);
    int behind = first + known.length();
    if (known.isEmpty() || attribute && behind < limit && goesOn(file.charAt(behind))) {
      return null;
    }
    return new CharacterReference(start, behind, Entities.getByName(known).codePointAt(0));
  }

  /**
   * The reference that starts at an ampersand in XML, which ends with a semicolon; {@code null} if
   * there is none. The names are those of HTML, which has all that DocBook 4 declares.
   */
  static CharacterReference inXml(String file, int start, int limit) {
    CharacterReference found = at(file, start, limit, false);
    return found == null || file.charAt(found.end - 1) != ';' ? null : found;
  }

  /**
   * Offset behind a reference in XML to an entity that is no character; {@code start} if there is
   * none.
   *
   * @param start offset of an ampersand
   * @param declared the names of such entities that the file itself declares
   */
  static int behindEntity(String file, int start, int limit, Set<String> declared) {
    int end = start + 1;
    while (end < limit && end - start <= LONGEST_ENTITY && isOfName(file.charAt(end))) {
      end++;
    }
    if (end == start + 1 || end >= limit || file.charAt(end) != ';') {
      return start;
    }
    String name = file.substring(start + 1, end);
    return declared.contains(name) || !isCharacter(name) ? end + 1 : start;
  }

  /**
   * Whether a name is that of a character that people write in prose. HTML has names such as {@code
   * eg} and {@code ie} for rare signs, which documents give to abbreviations.
   */
  private static boolean isCharacter(String name) {
    int code = Entities.isNamedEntity(name) ? Entities.getByName(name).codePointAt(0) : RARE_SIGNS;
    return code < RARE_LETTERS || code >= NUMBER_FORMS && code < RARE_SIGNS;
  }

  private static boolean isOfName(char c) {
    return Character.isLetterOrDigit(c) || c == '-' || c == '_' || c == '.' || c == ':';
  }

  private static boolean goesOn(char c) {
    return c == '=' || isAlphanumeric(c);
  }

  private static CharacterReference numeric(String file, int start, int limit) {
    boolean hex = start + 2 < limit && (file.charAt(start + 2) | ' ') == 'x';
    int radix = hex ? 16 : 10;
    int first = start + (hex ? 3 : 2);
    int end = first;
    long code = 0;
    while (end < limit && isAlphanumeric(file.charAt(end)) && digit(file, end, radix) >= 0) {
      code = end - first > LONGEST_NUMBER ? code : code * radix + digit(file, end, radix);
      end++;
    }
    if (end == first) {
      return null;
    }
    int behind = end < limit && file.charAt(end) == ';' ? end + 1 : end;
    return new CharacterReference(start, behind, codePoint(code));
  }

  private static int digit(String file, int at, int radix) {
    return Character.digit(file.charAt(at), radix);
  }

  /** HTML, 13.2.5.80, numeric character reference end state: old pages mean Windows-1252. */
  private static int codePoint(long code) {
    if (code >= 0x80 && code <= 0x9F) {
      return new String(new byte[] {(byte) code}, WINDOWS).codePointAt(0);
    }
    boolean none = code == 0 || code > Character.MAX_CODE_POINT || code >= 0xD800 && code <= 0xDFFF;
    return none ? REPLACEMENT : (int) code;
  }

  private static boolean isAlphanumeric(char c) {
    return c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z' || c >= '0' && c <= '9';
  }

  boolean isBlank() {
    return Characters.isSpace(character);
  }

  /** An apostrophe, which may stand inside a word, or a character that nobody sees. */
  boolean isInsideWords() {
    return character == '\''
        || character == 0x2019
        || switch (Character.getType(character)) {
          case Character.FORMAT,
              Character.CONTROL,
              Character.NON_SPACING_MARK,
              Character.ENCLOSING_MARK,
              Character.COMBINING_SPACING_MARK ->
              true;
          default -> false;
        };
  }

  /** A quotation mark, which would part a stop from its blank. */
  boolean isQuotationMark() {
    return Characters.isClosing(character) && !isBracket()
        || character == 0x201E
        || character == 0x201A;
  }

  private boolean isBracket() {
    return Character.getType(character) == Character.END_PUNCTUATION;
  }

  /**
   * Offset of the character that stands for it: the same one, its base letter, a letter of the same
   * case, any letter or digit for a letter; the ampersand for everything else.
   */
  int standIn(String file) {
    int base =
        Normalizer.normalize(Character.toString(character), Normalizer.Form.NFD).codePointAt(0);
    int found = find(file, c -> c == character || c == base);
    if (found < 0 && Character.isUpperCase(character)) {
      found = find(file, Character::isUpperCase);
    }
    if (found < 0 && Character.isLetterOrDigit(character)) {
      found = find(file, Character::isLowerCase);
    }
    if (found < 0 && Character.isLetterOrDigit(character)) {
      found = find(file, Character::isDigit);
    }
    return found < 0 ? start : found;
  }

  private int find(String file, IntPredicate likeness) {
    for (int at = start; at < end; at++) {
      if (likeness.test(file.charAt(at))) {
        return at;
      }
    }
    return -1;
  }
}
