package dev.tallystick.engine;

import dev.tallystick.run.Alarm;
import dev.tallystick.text.Decoded;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.Consumer;

/**
 * The texts of files that the editor does not show, as last read. A file that is suddenly empty,
 * less than half as long, or not to be read is taken to be half written by another program: its
 * last text counts until the new state has been stable for one rest.
 *
 * <p>Files are read on the loop's thread: one file takes less time than it would take to keep
 * straight what happens while a worker reads it.
 */
final class DiskTexts {
  private final Map<Path, Optional<Decoded>> known = new TreeMap<>();
  private final Set<Path> touched = new HashSet<>();
  private final Map<Path, Half> halves = new TreeMap<>();
  private final Map<Path, String> told = new TreeMap<>();
  private final Disk disk;
  private final Alarm alarm;
  private final Consumer<String> log;

  /** A state that may be half of something. */
  private record Half(Optional<Decoded> text, long since) {}

  DiskTexts(Disk disk, Alarm alarm, Consumer<String> log) {
    this.disk = disk;
    this.alarm = alarm;
    this.log = log;
  }

  /** The text of a file; empty if it cannot be read. */
  Optional<Text> text(Path file) {
    return decoded(file).map(Decoded::text);
  }

  /** The places of a file whose bytes are no text. */
  List<Problem> problems(Path file) {
    return decoded(file).map(Decoded::problems).orElse(List.of());
  }

  /** Why a file cannot be read, if it could not be when it was looked at last. */
  Optional<String> trouble(Path file) {
    return Optional.ofNullable(told.get(file));
  }

  private Optional<Decoded> decoded(Path file) {
    if (!known.containsKey(file)) {
      known.put(file, read(file));
    } else if (touched.remove(file)) {
      reread(file);
    }
    return known.get(file);
  }

  /** Nobody needs these files any more. */
  void forget(Collection<Path> files) {
    known.keySet().removeAll(files);
    halves.keySet().removeAll(files);
    touched.removeAll(files);
    told.keySet().removeAll(files);
  }

  /** All files whose text is known. */
  List<Path> files() {
    return List.copyOf(known.keySet());
  }

  /** Whether the text of a file is at hand, so that the disk need not be asked. */
  boolean knows(Path file) {
    return known.containsKey(file) && !touched.contains(file);
  }

  /** A file has been written, perhaps; it is read when somebody wants its text. */
  void changed(Path file) {
    if (known.containsKey(file)) {
      touched.add(file);
    }
  }

  private void reread(Path file) {
    Optional<Decoded> now = read(file);
    if (!looksHalf(known.get(file), now)) {
      halves.remove(file);
      take(file, now);
    } else if (!halves.containsKey(file) || !halves.get(file).text().equals(now)) {
      halves.put(file, new Half(now, alarm.millis()));
    }
  }

  /** Time has passed: takes what has been stable for a rest, in milliseconds. */
  void settle(long rest) {
    for (Map.Entry<Path, Half> entry : List.copyOf(halves.entrySet())) {
      Path file = entry.getKey();
      reread(file);
      Half half = halves.get(file);
      if (half != null && alarm.millis() - half.since() >= rest) {
        halves.remove(file);
        take(file, half.text());
      }
    }
  }

  /** When a file that may be half written will have been stable for a rest, by the alarm. */
  OptionalLong due(long rest) {
    return halves.values().stream().mapToLong(half -> half.since() + rest).min();
  }

  private void take(Path file, Optional<Decoded> text) {
    if (!known.get(file).equals(text)) {
      known.put(file, text);
    }
  }

  private static boolean looksHalf(Optional<Decoded> before, Optional<Decoded> now) {
    return before.isPresent() && now.map(DiskTexts::length).orElse(0) * 2 < length(before.get());
  }

  private static int length(Decoded decoded) {
    return decoded.text().length();
  }

  private Optional<Decoded> read(Path file) {
    try {
      Decoded decoded = Intake.load(disk, file);
      told.remove(file);
      return Optional.of(decoded);
    } catch (Unreadable e) {
      return unreadable(file, e.getMessage());
    } catch (OutOfMemoryError e) {
      return unreadable(
          file,
          file + ": too long for the memory of this program. Split the file, or close others.");
    }
  }

  /** Nobody wants to be told the same at every look. */
  private Optional<Decoded> unreadable(Path file, String why) {
    if (!why.equals(told.put(file, why))) {
      log.accept(why);
    }
    return Optional.empty();
  }
}
