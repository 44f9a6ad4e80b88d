package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Function;

/** What is known of a file and of what it is paired with: the ground for every answer. */
public final class Known {
  /** Of a file that is in no pair. */
  public static final Known NOTHING =
      new Known(Path.of(""), new Text(""), List.of(), Path::toString, file -> OptionalInt.empty());

  private final Path file;
  private final Text text;
  private final List<Settled> pairs;
  private final Uris uris;
  private final Function<Path, OptionalInt> versions;

  /**
   * Takes the pairs that a question rests on, sorted.
   *
   * @param versions the editor's number for the text of a file, if it shows the file
   */
  Known(
      Path file, Text text, List<Settled> pairs, Uris uris, Function<Path, OptionalInt> versions) {
    this.file = file;
    this.text = text;
    this.pairs = List.copyOf(pairs);
    this.uris = uris;
    this.versions = versions;
  }

  /** The text that the question was asked of. */
  public Text text() {
    return text;
  }

  /** What stands for the sentence at a place, a UTF-16 offset. */
  public Answer at(int offset) {
    return Answer.of(own(), file, offset, uris);
  }

  /** Where the sentence at a place, a UTF-16 offset, stands in all languages. */
  public References references(int offset) {
    return References.of(at(offset), pairs, uris);
  }

  /**
   * What lies around each of some places, UTF-16 offsets: sentence, block, section and file, each
   * inside the next; empty if nothing is known of the text.
   */
  public Optional<List<List<Span>>> surrounding(List<Integer> offsets) {
    return own().stream()
        .findFirst()
        .map(pair -> new Surrounding(pair.reading(file)))
        .map(surrounding -> offsets.stream().map(surrounding::at).toList());
  }

  /** The headings that are in no section of another; none if nothing is known of the text. */
  public List<Heading> outline() {
    return Outline.of(own(), file);
  }

  /** What was found in all of the pairs. */
  public Summary summary() {
    return Summary.of(pairs);
  }

  /** The sentences of the whole file, in each of its pairs. */
  public List<Count> counts() {
    return own().stream().map(pair -> pair.tally(file).whole()).toList();
  }

  /** What it is paired with: the other files, as the editor names them. */
  public List<String> others() {
    return own().stream()
        .map(pair -> uris.uri(pair.files().file(pair.files().side(file).other())))
        .toList();
  }

  /** A file, as the editor names it. */
  public String uri(Path of) {
    return uris.uri(of);
  }

  /** The editor's number for the text of a file; empty if it does not show the file. */
  public OptionalInt version(Path of) {
    return versions.apply(of);
  }

  /** Which side of a pair the file is. */
  public OnSide side(Settled pair) {
    return pair.files().side(file);
  }

  /** The pairs that the file itself is in. */
  public List<Settled> own() {
    return pairs.stream().filter(pair -> pair.files().has(file)).toList();
  }
}
