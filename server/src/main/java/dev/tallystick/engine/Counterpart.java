package dev.tallystick.engine;

import dev.tallystick.align.Match;
import dev.tallystick.align.Move;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * What stands at a place in one file of a pair, and what stands for it in the other.
 *
 * @param files the pair
 * @param side the side that was asked about
 * @param here the text of that side
 * @param there the text of the other
 * @param state how it stands with the sentence; nobody has got yet to a file without sentences
 * @param sentence the sentence at the place; empty, at the start, in a file without sentences
 * @param match all sentences on this side that share a counterpart with it, in order; itself alone
 *     if it has none
 * @param counterpart the sentences that stand for it on the other side; none if nothing does
 * @param jump where to go on the other side: from the first to the last of those; if there are
 *     none, the empty stretch behind the nearest matched sentence before, or at the file's start
 * @param prose the prose of the counterpart, a blank between sentences
 * @param finding what there is to tell of the sentence, if something is
 */
public record Counterpart(
    FilePair files,
    OnSide side,
    Text here,
    Text there,
    State state,
    Span sentence,
    List<Span> match,
    List<Span> counterpart,
    Span jump,
    String prose,
    Optional<Finding> finding) {
  /** Keeps the lists unchangeable. */
  public Counterpart {
    match = List.copyOf(match);
    counterpart = List.copyOf(counterpart);
  }

  /** Looks up a place, a UTF-16 offset into the text of a side. */
  public static Counterpart at(FilePair files, PairResult result, OnSide side, int offset) {
    int index = new Sentences(result.reading(side)).at(offset);
    return new Lookup(files, result, side).of(index);
  }

  /** From the first to the last sentence of the match on this side. */
  public Span whole() {
    return match.isEmpty() ? sentence : match.get(0).cover(match.get(match.size() - 1));
  }

  /** The matches of a pair, seen from one side. */
  private record Lookup(FilePair files, PairResult result, OnSide side) {
    Counterpart of(int index) {
      Optional<Move> move =
          result.alignment().moves().stream().filter(one -> index(one, side) == index).findFirst();
      return move.isPresent() ? moved(move.get()) : inPlace(index);
    }

    /**
     * Of one that stands at another place than in the source, the chain of matches knows nothing.
     */
    private Counterpart moved(Move move) {
      Segment here = segment(move, side);
      Segment there = segment(move, side.other());
      return counterpart(State.MOVED, here.span(), List.of(here), List.of(there), there.span());
    }

    private Counterpart inPlace(int index) {
      List<Match> matches = result.alignment().matches();
      int at = 0;
      while (at < matches.size() && !holds(matches.get(at), index)) {
        at++;
      }
      if (index < 0 || at == matches.size()) {
        return counterpart(State.PENDING, new Span(0, 0), List.of(), List.of(), new Span(0, 0));
      }
      Match match = matches.get(at);
      Segment segment = mine().get(index);
      State state = States.of(result).at(side, index);
      if (match.twoSided()) {
        List<Segment> theirs = segments(match, side.other());
        return counterpart(state, segment.span(), segments(match, side), theirs, cover(theirs));
      }
      return counterpart(state, segment.span(), List.of(segment), List.of(), gapBefore(at));
    }

    private Counterpart counterpart(
        State state, Span sentence, List<Segment> match, List<Segment> counterpart, Span jump) {
      return new Counterpart(
          files,
          side,
          result.reading(side).text(),
          result.reading(side.other()).text(),
          state,
          sentence,
          match.stream().map(Segment::span).toList(),
          counterpart.stream().map(Segment::span).toList(),
          jump,
          counterpart.stream().map(Segment::prose).collect(Collectors.joining(" ")).strip(),
          finding(sentence));
    }

    private Optional<Finding> finding(Span sentence) {
      return result.findings().stream()
          .filter(finding -> finding.side() == side && finding.span().overlaps(sentence))
          .findFirst();
    }

    private Span gapBefore(int at) {
      List<Match> matches = result.alignment().matches();
      for (int i = at - 1; i >= 0; i--) {
        if (matches.get(i).twoSided()) {
          int end = cover(segments(matches.get(i), side.other())).end();
          return new Span(end, end);
        }
      }
      return new Span(0, 0);
    }

    private boolean holds(Match match, int index) {
      return side == OnSide.SOURCE
          ? match.sourceFrom() <= index && index < match.sourceTo()
          : match.targetFrom() <= index && index < match.targetTo();
    }

    private List<Segment> segments(Match match, OnSide of) {
      List<Segment> all = result.reading(of).segments();
      return of == OnSide.SOURCE
          ? all.subList(match.sourceFrom(), match.sourceTo())
          : all.subList(match.targetFrom(), match.targetTo());
    }

    private Segment segment(Move move, OnSide of) {
      return result.reading(of).segments().get(index(move, of));
    }

    private static int index(Move move, OnSide of) {
      return of == OnSide.SOURCE ? move.source() : move.target();
    }

    private List<Segment> mine() {
      return result.reading(side).segments();
    }

    private static Span cover(List<Segment> segments) {
      return segments.get(0).span().cover(segments.get(segments.size() - 1).span());
    }
  }
}
