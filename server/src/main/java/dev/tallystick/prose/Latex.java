package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Set;

/**
 * LaTeX, read token by token. Nothing is executed: what commands and environments do is known of
 * those in our collection only. Braces are transparent, and what is left open ends at the next
 * blank line at the latest.
 */
final class Latex {
  /** Commands that show text though they stand before the document begins. */
  private static final Set<String> IN_PREAMBLE =
      Set.of(
          "title",
          "subtitle",
          "subject",
          "titlehead",
          "publishers",
          "uppertitleback",
          "lowertitleback",
          "dedication",
          "extratitle",
          "keywords",
          "abstract");

  private static final String DOCUMENT = "document";

  private final String file;
  private final List<LatexToken> tokens;
  private final LatexPlaces places = new LatexPlaces();
  private final LatexFlow flow;
  private final LatexFormulas formulas;
  private final LatexArguments arguments;
  private final LatexMacros macros;
  private int at;

  private Latex(String file) {
    this.file = file;
    this.tokens = LatexTokens.of(file);
    LatexLinks links = new LatexLinks(file, tokens);
    this.flow = new LatexFlow(file, places);
    this.formulas = new LatexFormulas(file, tokens, links, flow);
    this.arguments = new LatexArguments(file, tokens, links);
    this.macros = new LatexMacros(file, tokens, links, places, flow);
  }

  static List<Block> blocks(Text text) {
    Latex document = new Latex(text.string());
    document.read();
    return document.flow.finish();
  }

  private void read() {
    int begin = find(Kind.BEGIN, 0);
    int end = tokens.size();
    if (begin < end) {
      readPreamble(begin);
      end = find(Kind.END, begin);
      at = begin + 1;
    }
    while (at < end) {
      step();
    }
  }

  /** Index of the token that begins or ends the document; that behind all if none does. */
  private int find(Kind kind, int from) {
    int index = from;
    while (index < tokens.size() && !tokens.get(index).is(kind, DOCUMENT)) {
      index++;
    }
    return index;
  }

  private void readPreamble(int end) {
    while (at < end) {
      LatexToken token = tokens.get(at);
      String name = token.is(Kind.COMMAND) ? token.name() : "";
      if (macros.isInArgument() || IN_PREAMBLE.contains(name)) {
        step();
      } else if (LatexNames.command(name).equals(LatexNames.DEFINE)) {
        at = arguments.behindDefinition(at + 1);
      } else {
        at++;
      }
    }
    macros.endParagraph();
  }

  private void step() {
    if (macros.endsArgument(at)) {
      at = macros.endArgument(at);
      return;
    }
    int behind = formulas.read(at);
    at = behind > at ? behind : read(tokens.get(at));
  }

  /** Reads a token, or several that belong together; the index behind them. */
  private int read(LatexToken token) {
    switch (token.kind()) {
      case TEXT, BRACKET, BRACKET_END -> flow.text(token.start(), token.end());
      case BLANK -> blank(token);
      case BORDER -> macros.endParagraph();
      case COMMENT -> {}
      case OPEN, CLOSE -> flow.mark(token.start(), token.end());
      case DOLLAR -> flow.sign(token.start(), token.end());
      case CELL -> macros.part(token);
      case CODE -> code(token);
      case VERBATIM -> flow.verbatim(token);
      case END -> end(token);
      case COMMAND -> {
        return macros.command(at);
      }
      case BEGIN -> {
        return macros.environment(at);
      }
    }
    return at + 1;
  }

  private void blank(LatexToken token) {
    int lineBreak = LatexLinks.lineBreak(file, token);
    if (lineBreak < token.end()) {
      flow.blank(lineBreak, lineBreak + (file.startsWith("\r\n", lineBreak) ? 2 : 1), true);
    } else {
      flow.blank(token.start(), token.start() + 1, true);
    }
  }

  private void code(LatexToken token) {
    int end = token.end() - 1;
    flow.copied(end - token.name().length(), end);
    flow.mark(token.start(), token.end());
  }

  private void end(LatexToken token) {
    flow.close();
    places.close(token.name());
  }
}
