package dev.tallystick.engine;

import dev.tallystick.align.Unit;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Times;
import dev.tallystick.segment.Closing;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Words;
import dev.tallystick.text.Scripts;
import dev.tallystick.text.Text;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** What the aligner, which sees no text, is told of each segment. */
final class Units {
  /** Trust in a word with a digit, in any other, and in a very short one. */
  private static final double NUMBER = 0.9;

  private static final double WORD = 0.5;
  private static final double SHORT = 0.1;

  /** In a script without blanks, where nearly all words are short. */
  private static final double DENSE = 0.25;

  /** Words with the same beginning of so many characters may be forms of one word. */
  private static final int STEM = 5;

  /** Words with so many letters in common at the start may be related (Simard et al. 1992). */
  private static final int ROOT = 4;

  private final Map<Content, Unit> before;
  private final Map<Content, Unit> now = new HashMap<>();

  /** With what is known of an earlier state of the text. */
  private Units(Map<Content, Unit> before) {
    this.before = before;
  }

  /** Of a text of which nothing is known. */
  Units() {
    this(Map.of());
  }

  /** For the next state of the text, once this one is read. */
  Units next() {
    return new Units(now);
  }

  /** The same again, where this was given up. */
  Units again() {
    return new Units(before);
  }

  /** All that a unit is made of. */
  private record Content(
      String text, int length, boolean opens, int kind, Closing closing, Optional<Times> shown) {}

  /** Of a segment that has not changed the same object as in the earlier state. */
  Unit unit(Text text, Segment segment) {
    boolean verbatim = segment.verbatim();
    Content content =
        new Content(
            verbatim ? segment.span().of(text.string()) : segment.prose(),
            segment.length(),
            segment.opens(),
            verbatim ? -1 : kind(segment.block()),
            verbatim ? Closing.OPEN : segment.closing(),
            segment.shown());
    Unit known = now.containsKey(content) ? now.get(content) : before.get(content);
    Unit unit = known == null ? made(text, segment) : known;
    now.put(content, unit);
    return unit;
  }

  private static Unit made(Text text, Segment segment) {
    if (segment.verbatim()) {
      String content = segment.span().of(text.string()).strip().replaceAll("\\R", "\n");
      Unit.Word[] words = {new Unit.Word(key(content), NUMBER)};
      return new Unit(content.length(), content.length(), 0, true, 0, 0, words, true);
    }
    Unit unit = sentence(segment);
    return segment.shown().map(times -> unit.shown(times.from(), times.to())).orElse(unit);
  }

  private static Unit sentence(Segment segment) {
    String prose = segment.prose();
    return new Unit(
        segment.weight(),
        prose.codePointCount(0, prose.length()),
        letters(prose),
        segment.opens(),
        kind(segment.block()),
        segment.closing().ordinal(),
        words(prose),
        false);
  }

  private static Unit.Word[] words(String prose) {
    List<String> words = Words.of(prose);
    Unit.Word[] keyed = new Unit.Word[words.size()];
    for (int i = 0; i < keyed.length; i++) {
      keyed[i] = word(words.get(i));
    }
    return keyed;
  }

  private static Unit.Word word(String word) {
    double trust = trust(word);
    if (trust >= NUMBER || !Character.isLetter(word.codePointAt(0)) || trust == DENSE) {
      return new Unit.Word(key(word), trust);
    }
    long stem = key(word.substring(0, behind(word, STEM)));
    boolean longEnough = behind(word, ROOT - 1) < word.length();
    long root = longEnough ? key(word.substring(0, behind(word, ROOT))) : 0;
    return new Unit.Word(key(word), stem, root, trust);
  }

  /** Offset behind so many letters of a word and the marks on the last. */
  private static int behind(String word, int letters) {
    int count = 0;
    int at = 0;
    while (at < word.length()) {
      int c = word.codePointAt(at);
      count += Character.isLetterOrDigit(c) ? 1 : 0;
      if (count > letters) {
        return at;
      }
      at += Character.charCount(c);
    }
    return at;
  }

  private static int letters(String prose) {
    int letters = 0;
    for (int i = 0; i < prose.length(); ) {
      int c = prose.codePointAt(i);
      letters += Character.isLetterOrDigit(c) ? 1 : 0;
      i += Character.charCount(c);
    }
    return letters;
  }

  private static double trust(String word) {
    for (int i = 0; i < word.length(); i++) {
      if (word.charAt(i) >= '0' && word.charAt(i) <= '9') {
        return NUMBER;
      }
    }
    if (Scripts.isUnspaced(word.codePointAt(0))) {
      return DENSE;
    }
    return word.length() > 2 ? WORD : SHORT;
  }

  /** FNV-1a in 64 bits: the same on every machine. */
  private static long key(String word) {
    long hash = 0xcbf29ce484222325L;
    for (int i = 0; i < word.length(); i++) {
      hash = (hash ^ word.charAt(i)) * 0x100000001b3L;
    }
    return hash;
  }

  private static int kind(Block block) {
    return switch (block.kind()) {
      case PARAGRAPH, VERBATIM -> 0;
      case HEADING -> Math.min(Math.max(block.level(), 1), 6);
      case ITEM -> block.level() > 1 ? 8 : 7;
      case CELL -> 9;
      case QUOTATION -> 10;
      // One stands at the start of a file, the other never does: nobody takes one for the other.
      case NOTE, METADATA -> 11;
    };
  }
}
