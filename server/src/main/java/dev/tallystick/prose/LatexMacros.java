package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;

/** Commands and environments of LaTeX, with the arguments of theirs that are being read. */
final class LatexMacros {
  /** What follows an argument of an unknown command. */
  private static final String UNKNOWN = "?";

  private static final char IN_TEXT = 't';
  private static final char NO_PROSE = 's';
  private static final char QUOTED = 'q';
  private static final char NOTE = 'n';
  private static final char BLOCK = 'b';

  private final List<LatexToken> tokens;
  private final LatexLinks links;
  private final LatexPlaces places;
  private final LatexFlow flow;
  private final LatexArguments arguments;
  private final LatexSigns signs;
  private final Deque<Argument> open = new ArrayDeque<>();

  /**
   * An argument that is being read.
   *
   * @param kind as the collection has it
   * @param end index of the token that ends it
   * @param rest the arguments behind it
   * @param command name of what it belongs to
   */
  private record Argument(char kind, int end, String rest, String command) {}

  LatexMacros(
      String file, List<LatexToken> tokens, LatexLinks links, LatexPlaces places, LatexFlow flow) {
    this.tokens = tokens;
    this.links = links;
    this.places = places;
    this.flow = flow;
    this.arguments = new LatexArguments(file, tokens, links);
    this.signs = new LatexSigns(file, tokens, links, arguments, flow);
  }

  boolean isInArgument() {
    return !open.isEmpty();
  }

  /** Ends the block, and all arguments that were left open in it. */
  void endParagraph() {
    flow.closeAll();
    open.clear();
  }

  boolean endsArgument(int index) {
    return isInArgument() && index >= open.element().end();
  }

  /** Ends an argument; the index to go on at. */
  int endArgument(int index) {
    Argument argument = open.pop();
    LatexToken token = tokens.get(index);
    boolean closed =
        index == argument.end() && (token.is(Kind.CLOSE) || token.is(Kind.BRACKET_END));
    int end = closed ? token.end() : token.start();
    switch (argument.kind()) {
      case NOTE -> flow.closeNote(end);
      case QUOTED -> {
        if (closed) {
          flow.sign(token.start(), end);
        }
      }
      case IN_TEXT -> flow.mark(token.start(), end);
      default -> {
        flow.mark(token.start(), end);
        flow.close();
      }
    }
    int next = closed ? index + 1 : index;
    LatexToken rest = new LatexToken(Kind.COMMAND, end, end, argument.command());
    return argument.rest().equals(UNKNOWN)
        ? unknown(next, rest, true)
        : read(argument.rest(), next, rest);
  }

  /** Reads a command; the index to go on at. */
  int command(int index) {
    LatexToken token = tokens.get(index);
    int next = index + 1;
    String key = LatexNames.command(token.name());
    switch (key) {
      case LatexNames.SILENT -> {
        return silent(next, token);
      }
      case LatexNames.DEFINE -> {
        return arguments.behindDefinition(next);
      }
      case LatexNames.BORDER -> flow.close();
      case LatexNames.BLANK -> {
        flow.blank(token.start(), token.start() + 1, false);
        return arguments.behindOptions(next);
      }
      case LatexNames.SPACE -> {
        flow.blank(token.start(), token.start() + 1, false);
        return arguments.behindSilent(next);
      }
      case LatexNames.LINE -> {
        part(token);
        return arguments.behindSpacing(next);
      }
      case LatexNames.ACCENT, LatexNames.LETTER -> {
        return signs.letter(next, token);
      }
      default -> {
        if (token.name().equals("item")) {
          return item(next, token);
        }
        if (!Character.isLetter(token.name().charAt(0))) {
          signs.symbol(token);
          return next;
        }
        return key.isEmpty() ? unknown(next, token, false) : read(key, next, token);
      }
    }
    return next;
  }

  private int silent(int from, LatexToken command) {
    int next = arguments.behindSilent(from);
    if (command.name().equals("input") && next == from) {
      int name = arguments.behindBlank(from);
      next = arguments.is(Kind.TEXT, name) ? name + 1 : from;
    }
    if (flow.isOpen()) {
      flow.mark(command.start(), tokens.get(next - 1).end());
    }
    return next;
  }

  /** Parts cells or lines. */
  void part(LatexToken token) {
    boolean cells = token.is(Kind.CELL) || places.kind() == Block.Kind.CELL;
    if (cells && !isInArgument()) {
      flow.close();
    } else {
      flow.blank(token.start(), token.start() + 1, false);
    }
  }

  private int item(int from, LatexToken command) {
    flow.begin(Block.Kind.ITEM, places.level(Block.Kind.ITEM), command.start());
    int label = arguments.behindBlank(from);
    if (!arguments.is(Kind.BRACKET, label) || !links.isClosed(label)) {
      return arguments.behindOverlay(from);
    }
    open.push(new Argument(BLOCK, links.close(label), "", command.name()));
    return label + 1;
  }

  /** Begins an environment; the index to go on at. */
  int environment(int index) {
    LatexToken token = tokens.get(index);
    String name = token.name();
    int next = index + 1;
    flow.close();
    if (LatexNames.isEnvironment(LatexNames.MATHS, name)) {
      return next;
    }
    places.open(name);
    if (LatexNames.isEnvironment(LatexNames.HEADING, name)) {
      return directly("56", next, token);
    }
    if (LatexNames.isEnvironment(LatexNames.TITLED, name)) {
      if (arguments.is(Kind.BRACKET, next) && links.isClosed(next)) {
        flow.begin(Block.Kind.PARAGRAPH, 0, token.start());
        open.push(new Argument(BLOCK, links.close(next), "", name));
        return next + 1;
      }
      return directly("b", next, token);
    }
    boolean bare =
        LatexNames.isEnvironment(LatexNames.BARE, name)
            || LatexNames.isEnvironment(LatexNames.CELLS, name)
            || LatexNames.isEnvironment(LatexNames.LIST, name);
    return bare ? arguments.behindSilent(next) : title(next, token);
  }

  /** The arguments of an environment, if they follow without a blank. */
  private int directly(String kinds, int from, LatexToken command) {
    int next = arguments.behindOptions(from);
    return arguments.is(Kind.OPEN, next) ? read(kinds, next, command) : next;
  }

  /** What an unknown environment is given: a title if it is prose. */
  private int title(int from, LatexToken command) {
    int next = arguments.behindOptions(from);
    while (arguments.is(Kind.OPEN, next)) {
      if (links.isClosed(next) && arguments.isProse(next, false)) {
        return read("b", next, command);
      }
      next = arguments.behindOptions(arguments.behindGroup(next));
    }
    return next;
  }

  /** Reads the arguments of a known command up to the first one with prose. */
  private int read(String kinds, int from, LatexToken command) {
    int next = from;
    for (int i = 0; i < kinds.length(); i++) {
      next = arguments.behindOptions(next);
      int group = arguments.behindBlank(next);
      if (!arguments.is(Kind.OPEN, group)) {
        flow.mark(command.start(), command.end());
        return next;
      }
      if (kinds.charAt(i) != NO_PROSE) {
        String rest = kinds.substring(i + 1);
        return enter(
            new Argument(kinds.charAt(i), end(group), rest, command.name()), command, group);
      }
      next = arguments.behindGroup(group);
      flow.mark(command.start(), tokens.get(next - 1).end());
    }
    return next;
  }

  private int end(int group) {
    return links.isClosed(group) ? links.close(group) : links.lineEnd(group);
  }

  private int enter(Argument argument, LatexToken command, int group) {
    LatexToken brace = tokens.get(group);
    switch (argument.kind()) {
      case NOTE -> flow.openNote(command.start(), brace.end());
      case QUOTED -> flow.sign(brace.start(), brace.end());
      case IN_TEXT -> flow.mark(command.start(), brace.end());
      case BLOCK -> flow.begin(Block.Kind.PARAGRAPH, 0, command.start());
      default -> flow.begin(Block.Kind.HEADING, argument.kind() - '0', command.start());
    }
    if (argument.kind() != IN_TEXT || !argument.rest().isEmpty()) {
      open.push(argument);
    }
    return group + 1;
  }

  /**
   * Reads what an unknown command is given; without anything it stands for something itself.
   *
   * @param goesOn whether something that it is given has come already
   */
  private int unknown(int from, LatexToken command, boolean goesOn) {
    int next = arguments.behindOptions(from);
    boolean given = goesOn || next > from;
    while (arguments.is(Kind.OPEN, next)) {
      if (arguments.isProse(next, flow.isOpen() || arguments.goesOn(next))) {
        boolean more = links.isClosed(next) && arguments.is(Kind.OPEN, links.close(next) + 1);
        return enter(
            new Argument(IN_TEXT, end(next), more ? UNKNOWN : "", command.name()), command, next);
      }
      given |= !arguments.isEmpty(next);
      next = arguments.behindOptions(arguments.behindGroup(next));
    }
    if (given) {
      flow.mark(command.start(), tokens.get(next - 1).end());
    } else {
      flow.sign(command.start(), command.end());
    }
    return next;
  }
}
