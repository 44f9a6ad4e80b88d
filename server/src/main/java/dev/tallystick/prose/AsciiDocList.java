package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The open lists of an AsciiDoc file: which markers are nested in which. */
final class AsciiDocList {
  private static final int DEEPEST = 50;
  private static final Pattern MARKER =
      Pattern.compile(
          "(-|\\*{1,5}|\\u2022|\\.{1,5}|\\d{1,9}\\.|[A-Za-z]\\.|[IVXivx]{1,9}\\)|<(?:\\d{1,9}|\\.)>)"
              + "[ \\t]++(?=\\S)(?:\\[[ xX*]][ \\t]++)?+");
  private static final Pattern TERM =
      Pattern.compile("(?=\\S)(.*?)(:::?:?|;;)(?:[ \\t]++(?=\\S)|$)");
  private static final Pattern RULE = Pattern.compile("([-*])[ \\t]+\\1[ \\t]+\\1");

  private final int base;
  private final List<String> markers = new ArrayList<>();

  /**
   * No list yet.
   *
   * @param base level of the item that all of it stands in; 0 for none
   */
  AsciiDocList(int base) {
    this.base = base;
  }

  /**
   * The first line of an item.
   *
   * @param marker what its list is known by
   * @param term what a description list describes
   * @param behindMarker offset behind the marker
   * @param text the rest of the line; empty if the text comes later
   */
  record Item(String marker, Optional<Span> term, int behindMarker, Span text) {}

  /** The item that a line opens; empty if it opens none. */
  static Optional<Item> item(String file, Span line) {
    Matcher marker = MARKER.matcher(file).region(line.start(), line.end());
    if (marker.lookingAt()) {
      Span text = new Span(marker.end(), line.end());
      boolean rule = RULE.matcher(file).region(line.start(), line.end()).matches();
      return rule || text.isEmpty()
          ? Optional.empty()
          : Optional.of(new Item(family(marker.group(1)), Optional.empty(), marker.end(), text));
    }
    Matcher term = TERM.matcher(file).region(line.start(), line.end());
    if (!term.lookingAt() || term.end(1) == line.start()) {
      return Optional.empty();
    }
    Span described = new Span(term.start(1), term.end(1));
    Span text = new Span(term.end(), line.end());
    return Optional.of(new Item(term.group(2), Optional.of(described), term.end(2), text));
  }

  /** Goes to the list with this marker, out of others or deeper; the level of its items. */
  int enter(String marker) {
    int at = markers.indexOf(marker);
    if (at >= 0) {
      markers.subList(at + 1, markers.size()).clear();
    } else if (markers.size() < DEEPEST) {
      markers.add(marker);
    }
    return level();
  }

  /** Leaves so many lists, but not the outermost. */
  void leave(int count) {
    int stay = Math.max(1, markers.size() - count);
    markers.subList(Math.min(stay, markers.size()), markers.size()).clear();
  }

  void clear() {
    markers.clear();
  }

  boolean isEmpty() {
    return markers.isEmpty();
  }

  /** Level of the innermost list from 1; that of the item around if there is none. */
  int level() {
    return base + markers.size();
  }

  /** The same for all numbers, and for all letters of a case. */
  private static String family(String marker) {
    char first = marker.charAt(0);
    char last = marker.charAt(marker.length() - 1);
    if (Character.isDigit(first)) {
      return "1.";
    }
    if (Character.isLetter(first)) {
      return (Character.isUpperCase(first) ? "A" : "a") + last;
    }
    return first == '<' ? "<>" : marker;
  }
}
