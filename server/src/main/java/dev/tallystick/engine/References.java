package dev.tallystick.engine;

import dev.tallystick.check.OnSide;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Where a sentence stands in all languages of its file.
 *
 * @param itself its whole match on this side, the longest if languages differ; empty if its file is
 *     in no pair, or without sentences
 * @param others its matches in the other files, the source first
 */
public record References(Optional<Span> itself, List<At> others) {
  /**
   * A match in one file.
   *
   * @param uri the file, as the editor names it
   * @param text what stands in it
   * @param span from the first to the last sentence of the match
   */
  public record At(String uri, Text text, Span span) {}

  /** Keeps the list unchangeable. */
  public References {
    others = List.copyOf(others);
  }

  /**
   * Follows an answer to all languages.
   *
   * @param family the pairs of the file and those that share its source
   */
  static References of(Answer answer, List<Settled> family, Uris uris) {
    Found found = new Found(uris, new LinkedHashMap<>());
    for (Answer.At at : answer.all()) {
      found.add(at.counterpart());
    }
    for (Answer.At at : answer.all()) {
      if (at.counterpart().side() == OnSide.TARGET) {
        found.addThroughSource(at.counterpart(), family);
      }
    }
    Optional<Span> itself =
        answer.all().stream()
            .map(at -> at.counterpart().whole())
            .reduce(Span::cover)
            .filter(span -> !span.isEmpty());
    return new References(itself, found.places());
  }

  /** The matches found so far, by the pair and the side that led there. */
  private record Found(Uris uris, Map<FilePair, List<At>> byPair) {
    void add(Counterpart counterpart) {
      List<At> found = byPair.computeIfAbsent(counterpart.files(), pair -> new ArrayList<>());
      if (!counterpart.counterpart().isEmpty()) {
        String uri = uris.uri(counterpart.files().file(counterpart.side().other()));
        At at = new At(uri, counterpart.there(), counterpart.jump());
        if (!found.contains(at)) {
          found.add(at);
        }
      }
    }

    /**
     * From a translation to the others: each sentence of the source that it stands for leads on.
     */
    void addThroughSource(Counterpart translation, List<Settled> family) {
      FilePair own = translation.files();
      for (Settled sibling : family) {
        boolean other =
            sibling.files().source().equals(own.source()) && !sibling.files().equals(own);
        for (Span sentence : other ? translation.counterpart() : List.<Span>of()) {
          add(sibling.counterpart(own.source(), sentence.start()));
        }
      }
    }

    List<At> places() {
      return byPair.values().stream().flatMap(List::stream).toList();
    }
  }
}
