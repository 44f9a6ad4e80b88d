package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * Looks for scale and offset of a {@link Clock}: for each scale that there is a reason for, the
 * differences of begins are counted, and where many more fall into one place than chance would have
 * it, there is the offset. By Chernoff's bound, {@code q n} of {@code n} where chance gives each
 * the probability {@code p} is no likelier than {@code exp(-n KL(q, p))}; each hypothesis pays for
 * how many there are, and one that another comes near is not taken.
 */
final class ClockSearch {
  /**
   * Pictures a second of films, of television, and of films as television in America shows them.
   */
  private static final double[] RATES = {24, 25, 24_000 / 1001.0};

  /** Scales that there is a reason for: none, and from each of these rates to another. */
  static final List<Double> SCALES = scales();

  /** Half of the translations for another cut are no farther off (seconds). Our own guess. */
  private static final double USUAL_OFFSET = 10;

  /** How much likelier than chance the offset has to be, and than any other (nats). */
  private static final double LEAST = 3;

  /** Where the plain scale fits so large a share, no other one is tried. */
  private static final double OBVIOUS = 0.8;

  /** So close all along the text, two hypotheses are one (seconds). */
  private static final double SAME = 1.6;

  /** Of long texts so many begins are looked at. */
  private static final int SAMPLE = 400;

  /** So many begins of the source are looked at to either side of where one is expected. */
  private static final int NEIGHBOURS = 256;

  private final Timeline source;
  private final Timeline target;
  private final double earliest;
  private final double latest;
  private final List<Offsets.Peak> peaks = new ArrayList<>();

  private ClockSearch(Sides sides) {
    this.source = sides.source().timeline;
    this.target = sides.target().timeline;
    double[] begins = source.begins();
    this.earliest = Arrays.stream(begins).min().orElse(0);
    this.latest = Arrays.stream(begins).max().orElse(0);
  }

  /** By all begins, whatever belongs together; null if nothing stands out. */
  static Clock byTimes(Sides sides) {
    ClockSearch search = new ClockSearch(sides);
    double[] from = search.source.begins();
    double[] to = sample(search.target.begins());
    Arrays.sort(from);
    double apart = Timeline.median(to) - Timeline.median(from);
    for (double scale : SCALES) {
      search.count(from, to, scale, 0);
      if (Math.abs(apart) > Offsets.FARTHEST / 2) {
        search.count(from, to, scale, apart);
      }
      if (scale == 1 && search.obvious()) {
        break;
      }
    }
    return search.best();
  }

  /** By links that are likely for other reasons; null if nothing stands out. */
  static Clock byLinks(Sides sides, List<ClockFit.Link> links) {
    ClockSearch search = new ClockSearch(sides);
    for (double scale : SCALES) {
      search.count(links, scale);
    }
    return search.best();
  }

  /** Of the scales that there is a reason for, the nearest one. */
  static double likelyScale(double scale) {
    return SCALES.stream()
        .min(Comparator.comparingDouble(likely -> Math.abs(likely - scale)))
        .orElseThrow();
  }

  private static List<Double> scales() {
    List<Double> scales = new ArrayList<>(List.of(1.0));
    for (double rate : RATES) {
      for (double other : RATES) {
        if (rate != other) {
          scales.add(rate / other);
        }
      }
    }
    return scales;
  }

  private static double[] sample(double[] begins) {
    double[] sample = new double[Math.min(SAMPLE, begins.length)];
    for (int i = 0; i < sample.length; i++) {
      sample[i] = begins[(int) ((long) i * begins.length / sample.length)];
    }
    return sample;
  }

  private void count(double[] from, double[] to, double scale, double middle) {
    Offsets offsets = new Offsets(scale, middle);
    for (int t = 0; t < to.length; t++) {
      int found = Arrays.binarySearch(from, (to[t] - middle) / scale);
      int near = found < 0 ? -found - 1 : found;
      int last = Math.min(from.length, near + NEIGHBOURS);
      for (int s = Math.max(0, near - NEIGHBOURS); s < last; s++) {
        offsets.add(t, to[t] - scale * from[s], 1);
      }
    }
    Offsets.Prior prior = new Offsets.Prior(0, USUAL_OFFSET);
    offsets.peaks(to.length, source.step(), prior, LEAST, peaks);
  }

  private void count(List<ClockFit.Link> links, double scale) {
    double middle =
        Timeline.median(links.stream().mapToDouble(link -> link.offset(scale)).toArray());
    Offsets offsets = new Offsets(scale, middle);
    double all = 0;
    for (ClockFit.Link link : links) {
      offsets.add(link.target(), link.offset(scale), link.posterior());
      all += link.posterior();
    }
    Offsets.Prior prior = new Offsets.Prior(middle, source.step());
    offsets.peaks(all, source.step(), prior, LEAST, peaks);
  }

  private boolean obvious() {
    return peaks.stream().anyMatch(peak -> peak.share() >= OBVIOUS);
  }

  private Clock best() {
    peaks.sort(Comparator.comparingDouble(Offsets.Peak::worth).reversed());
    for (Offsets.Peak peak : peaks) {
      if (peak.worth() > peaks.get(0).worth() - LEAST && !same(peak, peaks.get(0))) {
        return null;
      }
    }
    return peaks.isEmpty()
        ? null
        : Clock.start(peaks.get(0).scale(), peaks.get(0).offset(), target);
  }

  private boolean same(Offsets.Peak one, Offsets.Peak other) {
    return Math.abs(one.at(earliest) - other.at(earliest)) <= SAME
        && Math.abs(one.at(latest) - other.at(latest)) <= SAME;
  }
}
