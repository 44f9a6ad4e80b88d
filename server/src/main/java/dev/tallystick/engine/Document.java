package dev.tallystick.engine;

import dev.tallystick.text.Edit;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * A file that the editor shows. It is lost once an edit came that its text cannot have: then nobody
 * knows what the editor shows, until it sends the whole text again.
 */
final class Document {
  private final String language;
  private int version;
  private Text text;
  private boolean lost;
  private boolean announced;
  private boolean due = true;

  private Document(String language, int version, Text text, boolean lost) {
    this.language = language;
    this.version = version;
    this.text = text;
    this.lost = lost;
  }

  /**
   * One that the editor shows.
   *
   * @param language what the editor takes it for, as LSP names it; may be empty
   */
  static Document opened(String language, int version, Text text) {
    return new Document(language, version, text, false);
  }

  /** One that is edited though it was never opened. Nothing is known of it. */
  static Document unknown() {
    return new Document("", 0, new Text(""), true);
  }

  /**
   * Applies the changes.
   *
   * @return where the last one ended, as an offset into the text after; empty if there was none
   */
  OptionalInt edit(int newVersion, List<Change> changes) {
    version = newVersion;
    due = true;
    OptionalInt end = OptionalInt.empty();
    for (Change change : changes) {
      if (change instanceof Change.Whole whole) {
        Edit edit = Differences.between(text, whole.text());
        end = OptionalInt.of(edit.span().start() + edit.replacement().length());
        text = whole.text();
        lost = false;
      } else if (change instanceof Change.Part part && !lost) {
        Optional<Span> span = place(part);
        lost = span.isEmpty();
        end = span.isEmpty() ? end : OptionalInt.of(replace(span.get(), part.replacement()));
      }
    }
    return lost ? OptionalInt.empty() : end;
  }

  /** An edit that fails for what the editor sent is one that the text cannot have. */
  private Optional<Span> place(Change.Part part) {
    try {
      return part.place().apply(text);
    } catch (RuntimeException e) {
      return Optional.empty();
    }
  }

  private int replace(Span span, String replacement) {
    text = text.with(new Edit(span, replacement));
    return span.start() + replacement.length();
  }

  /** What the editor takes it for, as LSP names it; may be empty. */
  String language() {
    return language;
  }

  int version() {
    return version;
  }

  Text text() {
    return text;
  }

  boolean lost() {
    return lost;
  }

  /** Whether the user is to be told that it is lost: once each time. */
  boolean announcesLoss() {
    boolean now = lost && !announced;
    announced = lost;
    return now;
  }

  /** Whether it has changed since its findings were published last. */
  boolean due() {
    return due;
  }

  void published() {
    due = false;
  }
}
