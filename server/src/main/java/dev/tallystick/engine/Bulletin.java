package dev.tallystick.engine;

import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * What has been published, so that a list goes out when it is due and no list is left standing: a
 * document that was edited gets one with its version though the findings are the same; any other
 * file gets one when it differs from the last; and what was not empty is taken back in the end.
 */
final class Bulletin implements Uris {
  private final Map<Path, Publication> last = new TreeMap<>();
  private final Map<Path, String> names = new TreeMap<>();
  private final Map<Path, Grounds> grounds = new TreeMap<>();
  private final Audience audience;

  Bulletin(Audience audience) {
    this.audience = audience;
  }

  /** The editor names a file like this; under another name, what was shown is taken back. */
  void name(Path file, String uri) {
    Publication before = last.get(file);
    if (before != null && !before.uri().equals(uri)) {
      audience.publish(
          new Publication(before.uri(), OptionalInt.empty(), before.text(), List.of()));
      last.remove(file);
    }
    if (!uri.equals(names.put(file, uri))) {
      grounds.clear(); // others may point at this one
    }
  }

  /**
   * Whether all that a file's notices rest on is as it was when they were published last.
   *
   * @param now the objects; the same ones for as long as nothing changes
   */
  boolean rests(Path file, List<Object> now) {
    Grounds before = grounds.put(file, new Grounds(now));
    return before != null && before.same(now);
  }

  /** What a publication rests on. */
  private record Grounds(List<Object> objects) {
    boolean same(List<Object> others) {
      boolean same = objects.size() == others.size();
      for (int i = 0; same && i < others.size(); i++) {
        same = objects.get(i) == others.get(i); // comparing texts would cost more than it saves
      }
      return same;
    }
  }

  /** Nothing is to be shown in any other file than these, nor is anything. */
  void retain(Collection<Path> files) {
    grounds.keySet().retainAll(files);
  }

  @Override
  public String uri(Path file) {
    return names.computeIfAbsent(file, path -> path.toUri().toString());
  }

  /** The files that something is shown in. */
  Set<Path> files() {
    return new TreeSet<>(last.keySet());
  }

  /** Publishes what a file that the editor shows is to show, if it is due. */
  void publish(Path file, Document document, List<Notice> notices) {
    if (document.due() || differs(file, document.text(), notices)) {
      document.published();
      send(file, OptionalInt.of(document.version()), document.text(), notices);
    }
  }

  /** Publishes what another file is to show, if it is due. */
  void publish(Path file, Text text, List<Notice> notices) {
    if (differs(file, text, notices)) {
      send(file, OptionalInt.empty(), text, notices);
    }
  }

  /** Whether a file shows something else than these; it may be the text that gives them places. */
  private boolean differs(Path file, Text text, List<Notice> notices) {
    Publication before = last.get(file);
    if (before == null || notices.isEmpty()) {
      return before != null || !notices.isEmpty();
    }
    return !before.notices().equals(notices) || !before.text().equals(text);
  }

  private void send(Path file, OptionalInt version, Text text, List<Notice> notices) {
    Publication publication = new Publication(uri(file), version, text, notices);
    audience.publish(publication);
    if (notices.isEmpty()) {
      last.remove(file);
    } else {
      last.put(file, publication);
    }
  }
}
