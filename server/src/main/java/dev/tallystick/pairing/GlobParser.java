package dev.tallystick.pairing;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;

/** Reads a glob into steps. */
final class GlobParser {
  private final String glob;
  private final List<Step> steps = new ArrayList<>();
  private final Deque<Choice> open = new ArrayDeque<>();
  private int at;

  /**
   * One step on the way through a name.
   *
   * @param kind what it takes
   * @param characters those that are meant, singly or as ranges: {@code a-z}
   * @param branches other steps, all later ones, that may be taken in its place
   */
  record Step(Kind kind, String characters, List<Integer> branches) {
    boolean takes(int c) {
      return switch (kind) {
        case ONE -> characters.codePointAt(0) == c;
        case ANY, MANY -> c != '/';
        case DEEP -> true;
        case AMONG -> c != '/' && isAmong(c);
        case OTHER -> c != '/' && !isAmong(c);
        case NONE -> false;
      };
    }

    /** Whether it takes any number of characters. */
    boolean repeats() {
      return kind == Kind.MANY || kind == Kind.DEEP;
    }

    private boolean isAmong(int c) {
      int[] given = characters.codePoints().toArray();
      for (int i = 0; i < given.length; i++) {
        boolean range = i + 2 < given.length && given[i + 1] == '-';
        if (given[i] <= c && c <= given[range ? i + 2 : i]) {
          return true;
        }
        i += range ? 2 : 0;
      }
      return false;
    }
  }

  /** What a step takes. */
  enum Kind {
    /** This character. */
    ONE,
    /** A character of a name. */
    ANY,
    /** Any number of them. */
    MANY,
    /** Any number of characters, across folders. */
    DEEP,
    /** One of some characters. */
    AMONG,
    /** One that is not among them. */
    OTHER,
    /** Nothing: only its branches count. */
    NONE
  }

  /** A choice in braces: where its alternatives start, and from where their ends lead on. */
  private record Choice(List<Integer> starts, List<List<Integer>> ends) {}

  private GlobParser(String glob) {
    this.glob = glob;
  }

  /** The steps; empty if a bracket or brace is not closed, or closes nothing. */
  static Optional<List<Step>> parse(String glob) {
    GlobParser parser = new GlobParser(glob);
    while (parser.at < glob.length()) {
      int c = glob.codePointAt(parser.at);
      parser.at += Character.charCount(c);
      if (!parser.step(c)) {
        return Optional.empty();
      }
    }
    return parser.open.isEmpty() ? Optional.of(List.copyOf(parser.steps)) : Optional.empty();
  }

  /** Reads the next step; whether it is in order. */
  private boolean step(int c) {
    switch (c) {
      case '*' -> star();
      case '?' -> add(Kind.ANY, "");
      case '[' -> {
        return set();
      }
      case '{' -> openChoice();
      case '}' -> {
        return closeChoice();
      }
      case ',' -> comma();
      default -> add(Kind.ONE, Character.toString(c));
    }
    return true;
  }

  private void star() {
    if (!glob.startsWith("*", at)) {
      addRepeated(Kind.MANY);
      return;
    }
    boolean whole = at == 1 || "/{,".indexOf(glob.charAt(at - 2)) >= 0;
    while (glob.startsWith("*", at)) {
      at++;
    }
    if (whole && glob.startsWith("/", at)) {
      at++;
      List<Integer> none = branch();
      none.add(steps.size());
      addRepeated(Kind.DEEP);
      add(Kind.ONE, "/");
      none.add(steps.size());
    } else {
      addRepeated(Kind.DEEP);
    }
  }

  private boolean set() {
    boolean other = glob.startsWith("!", at);
    int from = other ? at + 1 : at;
    int end = glob.indexOf(']', from + 1);
    if (end < 0) {
      return false;
    }
    add(other ? Kind.OTHER : Kind.AMONG, glob.substring(from, end));
    at = end + 1;
    return true;
  }

  private void openChoice() {
    List<Integer> starts = branch();
    starts.add(steps.size());
    open.push(new Choice(starts, new ArrayList<>()));
  }

  private void comma() {
    if (open.isEmpty()) {
      add(Kind.ONE, ",");
    } else {
      open.peek().ends().add(branch());
      open.peek().starts().add(steps.size());
    }
  }

  private boolean closeChoice() {
    if (open.isEmpty()) {
      return false;
    }
    open.pop().ends().forEach(end -> end.add(steps.size()));
    return true;
  }

  /** Adds a step that only branches; where to, is added later. */
  private List<Integer> branch() {
    List<Integer> branches = new ArrayList<>();
    steps.add(new Step(Kind.NONE, "", branches));
    return branches;
  }

  private void addRepeated(Kind kind) {
    steps.add(new Step(kind, "", List.of(steps.size() + 1)));
  }

  private void add(Kind kind, String characters) {
    steps.add(new Step(kind, characters, List.of()));
  }
}
