package dev.tallystick.pairing;

import java.util.Comparator;
import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;

/**
 * What belongs together among some files. Every file is in exactly one of the three lists; there it
 * is the target of one pair at most, and has the same language in all its pairs. Only where the
 * project states it, a file is the source of one pair and the target of another.
 *
 * @param pairs sorted by source, then target
 * @param alone files without a counterpart, sorted by path
 * @param ambiguities files whose source cannot be told, sorted by their first path
 */
public record Pairs(List<Pair> pairs, List<Alone> alone, List<Ambiguity> ambiguities) {
  /** Nothing. */
  public static final Pairs NONE = new Pairs(List.of(), List.of(), List.of());

  /** Takes sorted copies. */
  public Pairs {
    pairs = sorted(pairs, Comparator.comparing(Pair::source).thenComparing(Pair::target));
    alone = sorted(alone, Comparator.comparing(Alone::file));
    ambiguities = sorted(ambiguities, Comparator.comparing(one -> one.files().get(0)));
  }

  private static <T> List<T> sorted(List<T> all, Comparator<T> order) {
    return all.stream().sorted(order).toList();
  }

  /** These, and what belongs together among other files. */
  public Pairs and(Pairs others) {
    return new Pairs(
        joined(pairs, others.pairs),
        joined(alone, others.alone),
        joined(ambiguities, others.ambiguities));
  }

  private static <T> List<T> joined(List<T> one, List<T> other) {
    return Stream.concat(one.stream(), other.stream()).toList();
  }

  /** The same, each file by another name. */
  public Pairs renamed(UnaryOperator<String> names) {
    return new Pairs(
        pairs.stream().map(pair -> renamed(pair, names)).toList(),
        alone.stream().map(one -> new Alone(names.apply(one.file()), one.reason())).toList(),
        ambiguities.stream()
            .map(one -> new Ambiguity(one.files().stream().map(names).toList(), one.choices()))
            .toList());
  }

  private static Pair renamed(Pair pair, UnaryOperator<String> names) {
    return new Pair(
        names.apply(pair.source()),
        names.apply(pair.target()),
        pair.sourceLanguage(),
        pair.targetLanguage(),
        pair.why());
  }
}
