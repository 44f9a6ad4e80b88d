package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads the cues of a subtitle file. SubRip and WebVTT differ so little that either is read as
 * both: a file with the marks of the other, or with broken ones, loses no text.
 */
final class CueReader {
  private static final String TIME = "(-?)(?:(\\d{1,9}):)?(\\d{1,2}):(\\d{1,2})[.,](\\d{1,3})";
  private static final Pattern TIMES = Pattern.compile(TIME + "[ \\t]*+-->[ \\t]*+" + TIME);
  private static final Pattern NUMBER = Pattern.compile("\\d{1,9}");
  private static final Pattern HEADER = Pattern.compile("WEBVTT(?:[ \\t]|$)");
  private static final Pattern COMMENT = Pattern.compile("NOTE(?:[ \\t]|$)");
  private static final Pattern PLACE =
      Pattern.compile("\\b(?:line|region):[\\w.,%-]{1,40}|\\{\\\\an\\d}");
  private static final Pattern LANDMARK = Pattern.compile("(?:STYLE|REGION)$");

  private final String file;
  private final List<Span> lines;
  private final List<Cue> cues = new ArrayList<>();

  private CueReader(Text text) {
    this.file = text.string();
    this.lines = TrimmedLines.of(text);
  }

  /** The cues with text and the landmarks, in the order of the file. */
  static List<Cue> cues(Text text) {
    CueReader reader = new CueReader(text);
    int at = 0;
    if (!reader.lines.isEmpty() && reader.finds(HEADER, 0)) {
      at = reader.groupEnd(1);
    }
    while (at < reader.lines.size()) {
      at = reader.isBlank(at) ? at + 1 : reader.readGroup(at);
    }
    return reader.cues;
  }

  /** Reads lines up to a blank one; the index behind them. */
  private int readGroup(int first) {
    int end = groupEnd(first + 1);
    if (finds(COMMENT, first)) {
      return end;
    }
    if (finds(LANDMARK, first)) {
      cues.add(new Cue(lines.get(first).start(), lines.get(end - 1).end(), null, "", List.of()));
      return end;
    }
    boolean named = !isTimes(first) && isTimes(first + 1);
    int times = named ? first + 1 : first;
    if (isTimes(times)) {
      end = groupEnd(times + 1);
      addCue(lines.get(first), times, times + 1, end);
    } else if (!isNumber(first) || end > first + 1) {
      addCue(lines.get(first), -1, first, end);
    }
    return end;
  }

  private void addCue(Span start, int times, int from, int to) {
    if (from < to) {
      Times shown = times < 0 ? null : times(lines.get(times));
      String place = place(lines.get(times < 0 ? from : times)) + place(lines.get(from));
      int end = lines.get(to - 1).end();
      cues.add(new Cue(start.start(), end, shown, place, lines.subList(from, to)));
    }
  }

  /** What a line of times, or an override before the text, says of the place on the screen. */
  private String place(Span line) {
    Matcher place = PLACE.matcher(file).region(line.start(), line.end());
    StringBuilder found = new StringBuilder();
    while (place.find()) {
      found.append(place.group());
    }
    return found.toString();
  }

  /** Index of the first line from {@code at} that is blank or belongs to the next cue. */
  private int groupEnd(int at) {
    int end = at;
    while (end < lines.size()
        && !isBlank(end)
        && !isTimes(end)
        && !(isNumber(end) && isTimes(end + 1))) {
      end++;
    }
    return end;
  }

  private Times times(Span line) {
    Matcher matcher = TIMES.matcher(file).region(line.start(), line.end());
    return matcher.lookingAt() ? new Times(millis(matcher, 1), millis(matcher, 6)) : null;
  }

  /** A time below zero, as tools write it that move all cues to an earlier time, is one too. */
  private static long millis(Matcher matcher, int sign) {
    int group = sign + 1;
    long hours = matcher.group(group) == null ? 0 : Long.parseLong(matcher.group(group));
    long minutes = hours * 60 + Long.parseLong(matcher.group(group + 1));
    long seconds = minutes * 60 + Long.parseLong(matcher.group(group + 2));
    String fraction = (matcher.group(group + 3) + "00").substring(0, 3);
    long millis = seconds * 1000 + Long.parseLong(fraction);
    return matcher.group(sign).isEmpty() ? millis : -millis;
  }

  private boolean isBlank(int line) {
    return lines.get(line).isEmpty();
  }

  private boolean isTimes(int line) {
    return line < lines.size() && finds(TIMES, line);
  }

  private boolean isNumber(int line) {
    Span span = lines.get(line);
    return NUMBER.matcher(file).region(span.start(), span.end()).matches();
  }

  private boolean finds(Pattern pattern, int line) {
    Span span = lines.get(line);
    return pattern.matcher(file).region(span.start(), span.end()).lookingAt();
  }
}
