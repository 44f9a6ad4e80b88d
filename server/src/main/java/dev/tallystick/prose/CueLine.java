package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * One line of a cue's text.
 *
 * @param cue the cue that it stands in
 * @param span the line in the file
 * @param pieces its prose: without tags and without the dash of a speaker
 * @param prose the same as a string, without white space around it
 * @param dash whether it opens with the dash of a speaker
 * @param voice who speaks, where a tag names it; else empty
 */
record CueLine(Cue cue, Span span, List<Span> pieces, String prose, boolean dash, String voice) {
  /** A tag of either format, a time inside a cue, or an override such as {@code {\an8}}. */
  private static final Pattern TAG =
      Pattern.compile(
          "<v(?:\\.[^\\s<>]*+)?+[ \\t]++([^<>]*+)>|</?[\\p{L}.\\d][^<>]*+>|\\{\\\\[^{}]*+}");

  /** No sign of a number, no dash for a pause, and none that leads on in a sentence. */
  private static final Pattern DASH =
      Pattern.compile(
          "[-\u2010-\u2015](?![-\u2010-\u2015\\d])(?!(?<=\u2014)\\p{Ll})[ \\t\u00A0\u202F]*");

  private static final Pattern ASIDE =
      Pattern.compile("\\[[^\\[\\]]*]|\\([^()]*\\)|\uFF08[^\uFF08\uFF09]*\uFF09|[\u266A\u266B].*");
  private static final String MUSIC = "\u266A\u266B";

  /** Keeps the pieces unchangeable. */
  CueLine {
    pieces = List.copyOf(pieces);
  }

  /** Reads a line of a cue. */
  static CueLine of(String file, Cue cue, Span span) {
    List<Span> pieces = new ArrayList<>();
    String voice = "";
    Matcher tag = TAG.matcher(file).region(span.start(), span.end());
    int at = span.start();
    while (tag.find()) {
      addPiece(pieces, at, tag.start());
      voice = tag.group(1) == null ? voice : tag.group(1).strip();
      at = tag.end();
    }
    addPiece(pieces, at, span.end());
    boolean dash = takeDash(file, pieces);
    StringBuilder prose = new StringBuilder();
    pieces.forEach(piece -> prose.append(file, piece.start(), piece.end()));
    return new CueLine(cue, span, pieces, prose.toString().strip(), dash, voice);
  }

  /** Whether there is a letter or a digit, and not only a sign of music or the like. */
  boolean hasWords() {
    return prose.codePoints().anyMatch(Character::isLetterOrDigit);
  }

  /** Whether nobody says it: a sound in brackets, a line of a song. */
  boolean isAside() {
    return ASIDE.matcher(prose).matches();
  }

  /** Whether it ends as a sentence does. */
  boolean stops() {
    int end = wordsEnd();
    return end > 0
        && (Characters.isStop(prose.charAt(end - 1))
            || Characters.isCornerBracket(prose.charAt(prose.length() - 1)));
  }

  /** Whether its sentence goes on in a line: it does not stop, or only pauses before it. */
  boolean goesOnIn(CueLine next) {
    int end = wordsEnd();
    boolean pauses = prose.startsWith("\u2026", end - 1) || prose.startsWith("..", end - 2);
    int first = next.prose.isEmpty() ? ' ' : next.prose.codePointAt(0);
    boolean resumes =
        Character.isLowerCase(first) || first == '\u2026' || next.prose.startsWith("..");
    return !stops() || pauses && resumes;
  }

  /** Length of the prose without closing marks behind it. */
  private int wordsEnd() {
    int end = prose.length();
    while (end > 0
        && (Characters.isClosing(prose.charAt(end - 1))
            || Characters.isSpace(prose.charAt(end - 1))
            || MUSIC.indexOf(prose.charAt(end - 1)) >= 0)) {
      end--;
    }
    return end;
  }

  private static void addPiece(List<Span> pieces, int start, int end) {
    if (start < end) {
      pieces.add(new Span(start, end));
    }
  }

  private static boolean takeDash(String file, List<Span> pieces) {
    if (pieces.isEmpty()) {
      return false;
    }
    Span first = pieces.get(0);
    Matcher dash = DASH.matcher(file).region(first.start(), first.end());
    if (!dash.lookingAt()) {
      return false;
    }
    pieces.remove(0);
    if (dash.end() < first.end()) {
      pieces.add(0, new Span(dash.end(), first.end()));
    }
    return true;
  }
}
