package dev.tallystick.engine;

import dev.tallystick.prose.Format;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;

/**
 * The current text of every file that matters: the editor's if it shows the file, else the disk's.
 */
final class Shelf {
  private final Map<Path, Document> open = new TreeMap<>();
  private final Map<Path, Map<Tongue, Sheet>> sheets = new TreeMap<>();
  private final DiskTexts disk;

  Shelf(DiskTexts disk) {
    this.disk = disk;
  }

  void open(Path file, Document document) {
    open.put(file, document);
    disk.forget(Set.of(file));
  }

  void close(Path file) {
    open.remove(file);
  }

  /** The files that the editor shows, sorted. */
  Set<Path> open() {
    return open.keySet();
  }

  Optional<Document> document(Path file) {
    return Optional.ofNullable(open.get(file));
  }

  /** The text of a file; empty if it cannot be read or is lost. */
  Optional<Text> text(Path file) {
    Document document = open.get(file);
    if (document == null) {
      return onDisk(file) ? disk.text(file) : Optional.empty();
    }
    return document.lost() ? Optional.empty() : Optional.of(document.text());
  }

  /**
   * What is wrong with the bytes of a file; nothing of one that the editor shows, as it has none.
   */
  List<Problem> problems(Path file) {
    return open.containsKey(file) || !onDisk(file) ? List.of() : disk.problems(file);
  }

  /** Why a file that the editor does not show cannot be read, if it cannot. */
  Optional<String> trouble(Path file) {
    return open.containsKey(file) ? Optional.empty() : disk.trouble(file);
  }

  /**
   * The sheet of the current text; the same one as long as the text stays the same. A file that is
   * taken for two languages, in a pair made by hand and in another, has one for each.
   */
  Optional<Sheet> sheet(Path file, Tongue tongue, TextRules rules) {
    Optional<Text> text = text(file);
    Format format = format(file);
    Map<Tongue, Sheet> known = sheets.computeIfAbsent(file, path -> new LinkedHashMap<>());
    Sheet before = known.getOrDefault(tongue, new Sheet(new Text(""), format, tongue, rules));
    known.values().removeIf(sheet -> outdate(sheet, text, format, rules));
    text.ifPresent(now -> known.computeIfAbsent(tongue, in -> before.next(now, format, rules)));
    return Optional.ofNullable(known.get(tongue));
  }

  /** Tells whoever works on a sheet to stop if the text has moved on; whether it has. */
  private static boolean outdate(Sheet sheet, Optional<Text> text, Format format, TextRules rules) {
    boolean current = text.isPresent() && sheet.shows(text.get(), format, rules);
    if (!current) {
      sheet.outdate();
    }
    return !current;
  }

  /** The format of a file by its name, else by what the editor takes it for. */
  private Format format(Path file) {
    return Format.ofName(String.valueOf(file.getFileName()))
        .or(() -> document(file).flatMap(document -> Format.ofLanguage(document.language())))
        .orElse(Format.PLAIN);
  }

  /** Whether the text of a file is at hand, so that the disk need not be asked. */
  boolean knows(Path file) {
    return open.containsKey(file) || disk.knows(file);
  }

  /** A buffer without a file has a relative path. */
  private static boolean onDisk(Path file) {
    return file.isAbsolute();
  }

  /** Forgets what is known of all other files. */
  void retain(Collection<Path> files) {
    Set<Path> others = new HashSet<>(sheets.keySet());
    others.addAll(disk.files());
    others.removeAll(files);
    for (Path file : others) {
      sheets.getOrDefault(file, Map.of()).values().forEach(Sheet::outdate);
      sheets.remove(file);
    }
    disk.forget(others);
  }

  DiskTexts disk() {
    return disk;
  }
}
