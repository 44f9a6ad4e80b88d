package dev.tallystick.prose;

import dev.tallystick.prose.LatexToken.Kind;
import java.util.List;

/** Characters of LaTeX that are written with a backslash. */
final class LatexSigns {
  private static final String ESCAPABLE = "%&#$_{}";
  private static final String SPACING = ",;:!/-@()[]<+";

  private final String file;
  private final List<LatexToken> tokens;
  private final LatexLinks links;
  private final LatexArguments arguments;
  private final LatexFlow flow;

  LatexSigns(
      String file,
      List<LatexToken> tokens,
      LatexLinks links,
      LatexArguments arguments,
      LatexFlow flow) {
    this.file = file;
    this.tokens = tokens;
    this.links = links;
    this.arguments = arguments;
    this.flow = flow;
  }

  /** A letter of its own, or an accent with its letter, as it stands; the index behind it. */
  int letter(int from, LatexToken command) {
    boolean group = arguments.is(Kind.OPEN, from) && links.isClosed(from);
    int next = group ? arguments.behindGroup(from) : from;
    flow.text(command.start(), tokens.get(next - 1).end());
    boolean word = Character.isLetter(command.name().charAt(0));
    return word && arguments.is(Kind.BLANK, next) ? next + 1 : next;
  }

  /** A backslash with a character that is no letter. */
  void symbol(LatexToken command) {
    char name = command.name().charAt(0);
    boolean stop = command.start() > 0 && file.charAt(command.start() - 1) == '.';
    if (ESCAPABLE.indexOf(name) >= 0) {
      flow.mark(command.start(), command.end());
      flow.text(command.start() + 1, command.end());
    } else if (SPACING.indexOf(name) >= 0 || name == ' ' && !stop) {
      flow.mark(command.start(), command.end());
    } else {
      flow.sign(command.start(), command.end()); // as in "et al.\\ 2019", where no sentence ends
    }
  }
}
