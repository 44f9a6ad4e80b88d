package dev.tallystick.bench;

import dev.tallystick.align.Aligner;
import dev.tallystick.align.Alignment;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Format;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Text;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Reading a text and aligning a pair, warm, at several sizes. Compare within one run only. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 2)
@Fork(1)
public class AlignBenchmark {
  /** Sentences of the source. */
  @Param({"200", "2000", "10000", "20000"})
  public int sentences;

  private Text sourceText;
  private Reading source;
  private Reading target;

  /** Makes the pair. */
  @Setup
  public void makePair() {
    InventedPair pair = new InventedPair(sentences, 7);
    sourceText = new Text(pair.source());
    source = read(sourceText);
    target = read(new Text(pair.target()));
  }

  /** From the text to sentences and what the aligner knows of them: one side. */
  @Benchmark
  public Reading read() {
    return read(sourceText);
  }

  /** The adaptive model, fitting and all. */
  @Benchmark
  public Alignment adaptive() {
    return Aligner.ADAPTIVE.align(source.units(), target.units(), Cancellation.NONE);
  }

  /** The published model. */
  @Benchmark
  public Alignment published() {
    return Aligner.PUBLISHED.align(source.units(), target.units(), Cancellation.NONE);
  }

  private static Reading read(Text text) {
    return Reading.of(text, Format.PLAIN, "en", Cancellation.NONE);
  }
}
