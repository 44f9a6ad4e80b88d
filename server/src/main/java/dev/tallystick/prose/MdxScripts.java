package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Finds the imports and exports of MDX: from a line that begins with that word, first in the file
 * or behind a blank line, to the next blank line outside of brackets.
 */
final class MdxScripts {
  private static final Pattern START = Pattern.compile("(?:import|export)[ \\t{*\"'].*");
  private static final Pattern FENCE = Pattern.compile("[ \\t>]*(`{3,}|~{3,}).*");

  private final String file;
  private final Text text;
  private final List<Span> scripts = new ArrayList<>();
  private String fence = "";

  private MdxScripts(Text text) {
    this.file = text.string();
    this.text = text;
  }

  /** Those behind an offset, without the line end of their last line. */
  static List<Span> of(Text text, int from) {
    MdxScripts found = new MdxScripts(text);
    int first = from == text.length() ? text.lines() : text.place(from).line();
    boolean blank = true;
    for (int i = first; i < text.lines(); i++) {
      String line = found.line(i);
      if (blank && found.fence.isEmpty() && START.matcher(line).matches()) {
        i = found.add(i);
      }
      found.readFence(line);
      blank = line.isBlank();
    }
    return found.scripts;
  }

  /** Takes in the lines of one; the index of its last line. */
  private int add(int first) {
    int depth = 0;
    int last = first;
    for (int i = first; i < text.lines(); i++) {
      String line = line(i);
      if (line.isBlank()) {
        if (depth <= 0) {
          break;
        }
      } else if (i > last + 1 && !" \t}])".contains(line.substring(0, 1))) {
        // Behind a blank line only what is indented, or closes a bracket, can be code.
        break;
      } else {
        depth += depth(line);
        last = i;
      }
    }
    scripts.add(new Span(start(first), text.lineEnd(last)));
    return last;
  }

  private static int depth(String line) {
    int depth = 0;
    for (int i = 0; i < line.length(); i++) {
      depth += "{[(".indexOf(line.charAt(i)) >= 0 ? 1 : 0;
      depth -= "}])".indexOf(line.charAt(i)) >= 0 ? 1 : 0;
    }
    return depth;
  }

  private void readFence(String line) {
    Matcher matcher = FENCE.matcher(line);
    if (!matcher.matches()) {
      return;
    }
    String mark = matcher.group(1);
    if (fence.isEmpty()) {
      fence = mark;
    } else if (mark.startsWith(fence)) {
      fence = "";
    }
  }

  private int start(int line) {
    int start = text.lineStart(line);
    return start == 0 && file.startsWith("\uFEFF") ? 1 : start;
  }

  private String line(int number) {
    return file.substring(start(number), text.lineEnd(number));
  }
}
