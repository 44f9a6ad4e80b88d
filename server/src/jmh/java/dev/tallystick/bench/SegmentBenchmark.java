package dev.tallystick.bench;

import com.ibm.icu.text.BreakIterator;
import com.ibm.icu.util.ULocale;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.segment.Segmenter;
import dev.tallystick.text.Text;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * 10 million characters of Markdown: from the text to sentences, beside ICU's bare iteration over
 * the same text. The ratio of the two in one run is the figure; 2.5 is the bar.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 5)
@Measurement(iterations = 5, time = 5)
@Fork(value = 1, jvmArgsAppend = "-Xmx1500m")
public class SegmentBenchmark {
  private static final int LENGTH = 10_000_000;
  private static final int SENTENCES = 2_000;

  private String markdown;

  /** Makes the text: headings, paragraphs with emphasis and links, and lists. */
  @Setup
  public void makeText() {
    String[] paragraphs = new InventedPair(SENTENCES, 7).source().split("\n\n");
    StringBuilder text = new StringBuilder(LENGTH + SENTENCES);
    for (int i = 0; text.length() < LENGTH; i++) {
      String paragraph = paragraphs[i % paragraphs.length];
      switch (i % 6) {
        case 0 -> text.append("## Section ").append(i).append("\n\n").append(paragraph);
        case 1 -> text.append("* ").append(paragraph).append("\n* One of *two* items.");
        case 2 -> text.append(paragraph).append(" See [the map](map.md), e.g. Fig. 3.");
        default -> text.append(paragraph);
      }
      text.append("\n\n");
    }
    markdown = text.toString();
  }

  /** Extraction and segmentation. */
  @Benchmark
  public List<Segment> segments() {
    Text text = new Text(markdown);
    return Segmenter.of("en").segments(text, Format.MARKDOWN.blocks(text), Cancellation.NONE);
  }

  /** ICU's sentence iteration, nothing else. */
  @Benchmark
  public int bareIteration() {
    BreakIterator sentences = BreakIterator.getSentenceInstance(ULocale.ENGLISH);
    sentences.setText(markdown);
    int count = 0;
    while (sentences.next() != BreakIterator.DONE) {
      count++;
    }
    return count;
  }
}
