package dev.tallystick.lsp;

import com.google.gson.TypeAdapter;
import com.google.gson.annotations.JsonAdapter;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonToken;
import com.google.gson.stream.JsonWriter;
import dev.tallystick.engine.FilePair;
import dev.tallystick.engine.Standing;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * What {@code tallystick/progress} tells: the fields of {@code pairs --format jsonl}, with URIs for
 * paths.
 *
 * @param source the source
 * @param target its translation
 * @param sourceLanguage BCP 47 tag
 * @param targetLanguage BCP 47 tag
 * @param why how the two were found to belong together
 * @param done source words dealt with; null of a pair that is one no longer, or cannot be read
 * @param pending those that nobody has got to yet; null likewise
 * @param findings how many findings of each kind are shown
 */
record PairProgress(
    String source,
    String target,
    String sourceLanguage,
    String targetLanguage,
    String why,
    @JsonAdapter(value = Nullable.class, nullSafe = false) Integer done,
    @JsonAdapter(value = Nullable.class, nullSafe = false) Integer pending,
    Map<String, Integer> findings) {
  static PairProgress of(Standing standing) {
    FilePair files = standing.files();
    Map<String, Integer> findings = new LinkedHashMap<>();
    standing
        .figures()
        .ifPresent(some -> some.findings().forEach((code, n) -> findings.put(code.word(), n)));
    return new PairProgress(
        standing.source(),
        standing.target(),
        files.sourceLanguage().tag(),
        files.targetLanguage().tag(),
        files.why().word(),
        standing.figures().map(some -> some.progress().done()).orElse(null),
        standing.figures().map(some -> some.progress().pending()).orElse(null),
        findings);
  }

  /** A number whose absence is written out. */
  static final class Nullable extends TypeAdapter<Integer> {
    @Override
    public void write(JsonWriter out, Integer value) throws IOException {
      boolean before = out.getSerializeNulls();
      out.setSerializeNulls(true);
      out.value(value);
      out.setSerializeNulls(before);
    }

    @Override
    public Integer read(JsonReader in) throws IOException {
      if (in.peek() == JsonToken.NULL) {
        in.nextNull();
        return null;
      }
      return in.nextInt();
    }
  }
}
