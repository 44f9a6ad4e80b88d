package dev.tallystick.aid;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.engine.Gap;
import dev.tallystick.engine.PairResult;
import dev.tallystick.prose.Block;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * Sentences of the source that could be put into the translation.
 *
 * @param segments their indices among the source's segments, sorted; a verbatim block that belongs
 *     to them and is missing too is among them
 * @param reason why they could be
 * @param finding what is told of them; only of missing ones
 */
public record Wanted(List<Integer> segments, Reason reason, Optional<Finding> finding) {
  /** Why sentences could be put in. */
  public enum Reason {
    /** They are missing. */
    MISSING,
    /** Nobody has got to them yet, and the place that was asked about is on them. */
    PENDING,
    /** Nobody has got to it yet, and it would come next at the place that was asked about. */
    NEXT
  }

  /** Keeps the list unchangeable. */
  public Wanted {
    segments = List.copyOf(segments);
  }

  /** Those that a stretch of one side concerns, in UTF-16 offsets; empty for a caret. */
  public static List<Wanted> at(PairResult result, OnSide side, Span stretch) {
    Search search = new Search(result, new Places(result), stretch);
    return side == OnSide.SOURCE ? search.onSource() : search.onTarget();
  }

  private record Search(PairResult result, Places places, Span stretch) {
    List<Wanted> onSource() {
      List<Wanted> all = new ArrayList<>();
      omissions()
          .filter(finding -> concerns(finding.span()))
          .forEach(finding -> all.add(missing(finding)));
      List<Integer> touched =
          pending().filter(i -> concerns(source().get(i).span())).boxed().toList();
      if (!touched.isEmpty()) {
        all.add(new Wanted(touched, Reason.PENDING, Optional.empty()));
      }
      return all;
    }

    List<Wanted> onTarget() {
      List<Wanted> all = new ArrayList<>();
      omissions()
          .filter(finding -> concerns(around(finding.counterpart().start())))
          .forEach(finding -> all.add(missing(finding)));
      pending()
          .filter(i -> i == 0 || !waits(i - 1))
          .filter(i -> concerns(around(gap(places.before(i)))))
          .mapToObj(i -> new Wanted(List.of(i), Reason.NEXT, Optional.empty()))
          .forEach(all::add);
      return all;
    }

    private boolean concerns(Span span) {
      return stretch.isEmpty() ? span.touches(stretch.start()) : span.overlaps(stretch);
    }

    private Stream<Finding> omissions() {
      return result.findings().stream().filter(finding -> finding.code() == Code.OMISSION);
    }

    private Wanted missing(Finding finding) {
      List<Integer> run =
          IntStream.range(0, source().size())
              .filter(i -> belongs(source().get(i), finding.span()))
              .filter(i -> !comesAlong(source().get(i)) || !places.matched(i))
              .boxed()
              .toList();
      return new Wanted(run, Reason.MISSING, Optional.of(finding));
    }

    /** Whether a segment is of a missing run, and not only around a note that is. */
    private static boolean belongs(Segment segment, Span run) {
      Span span = segment.span();
      return span.overlaps(run) && (span.equals(run) || !span.cover(run).equals(span));
    }

    private static boolean comesAlong(Segment segment) {
      return segment.verbatim() || segment.block().kind() == Block.Kind.NOTE;
    }

    /** Sentences that nobody has got to and nothing stands for, not even a copy. */
    private IntStream pending() {
      return IntStream.range(0, source().size())
          .filter(i -> waits(i) && !source().get(i).verbatim());
    }

    private boolean waits(int index) {
      return result.pending().source(index) && !places.matched(index);
    }

    private int gap(int before) {
      return before < 0 ? 0 : Segment.end(result.target().segments(), before);
    }

    /** Around a gap: from the word before it to the sentence behind. */
    private Span around(int gap) {
      Text text = result.target().text();
      int start = Gap.word(text.string(), gap).map(Span::start).orElse(gap);
      int end = firstBehind(gap);
      return new Span(Math.min(start, gap), Math.max(gap, end));
    }

    /** Where the first target sentence behind an offset starts; the text's end if none does. */
    private int firstBehind(int offset) {
      List<Segment> segments = result.target().segments();
      int low = 0;
      int high = segments.size();
      while (low < high) {
        int middle = (low + high) / 2;
        if (segments.get(middle).span().start() < offset) {
          low = middle + 1;
        } else {
          high = middle;
        }
      }
      return low == segments.size()
          ? result.target().text().length()
          : segments.get(low).span().start();
    }

    private List<Segment> source() {
      return result.source().segments();
    }
  }
}
