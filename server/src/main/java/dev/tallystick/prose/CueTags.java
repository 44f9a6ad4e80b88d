package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What the tags of a cue mark: words in italics and in bold, be it over several lines. */
final class CueTags {
  private static final Pattern TAG = Pattern.compile("<(/?)([ib])\\b[^<>]{0,80}+>");

  private CueTags() {}

  /** Adds what a cue marks. A tag that is never closed marks nothing. */
  static void addTo(List<Inline> inlines, String file, Cue cue) {
    Map<String, Integer> open = new HashMap<>();
    Matcher tag = TAG.matcher(file).region(cue.start(), cue.end());
    while (tag.find()) {
      String name = tag.group(2);
      if (tag.group(1).isEmpty()) {
        open.putIfAbsent(name, tag.start());
      } else if (open.containsKey(name)) {
        Inline.Kind kind = name.equals("i") ? Inline.Kind.EMPHASIS : Inline.Kind.STRONG;
        inlines.add(new Inline(kind, new Span(open.remove(name), tag.end())));
      }
    }
  }
}
