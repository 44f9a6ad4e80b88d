package dev.tallystick.cli;

import dev.tallystick.align.Alignment;
import dev.tallystick.align.Match;
import dev.tallystick.run.Cancellation;
import dev.tallystick.segment.Segment;
import dev.tallystick.text.Span;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Prints which sentences stand for which. */
@Command(
    name = "align",
    mixinStandardHelpOptions = true,
    description = "Prints the matches of a source and its translation.")
final class AlignCommand implements Callable<Integer> {
  private final Console console;

  @Mixin private LanguageOptions languages;
  @Mixin private ModelOption model;

  @Mixin private FormatOption format;

  @Parameters(index = "0", paramLabel = "SOURCE", description = "The source file.")
  private Path source;

  @Parameters(index = "1", paramLabel = "TARGET", description = "Its translation.")
  private Path target;

  AlignCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() throws IOException {
    TwoFiles files = TwoFiles.read(console, source, target, languages.rules());
    Alignment alignment =
        model.aligner().align(files.source().units(), files.target().units(), Cancellation.NONE);
    for (Match match : alignment.matches()) {
      List<Segment> sources =
          sentences(files.source().segments(), match.sourceFrom(), match.sourceTo());
      List<Segment> targets =
          sentences(files.target().segments(), match.targetFrom(), match.targetTo());
      if (!sources.isEmpty() || !targets.isEmpty()) {
        print(sources, targets, match.confidence());
      }
    }
    return files.complete() ? Tallystick.FINE : Tallystick.UNUSABLE;
  }

  private void print(List<Segment> sources, List<Segment> targets, double confidence)
      throws IOException {
    if (format.forPrograms()) {
      new JsonLine(console.out())
          .span("source", span(sources))
          .span("target", span(targets))
          .put("sourceSentences", sources.size())
          .put("targetSentences", targets.size())
          .share("confidence", confidence)
          .end();
    } else {
      String shape =
          String.format(Locale.ROOT, "%d-%d  %.3f", sources.size(), targets.size(), confidence);
      console.out().println(console.paint(shape, "2"));
      console.out().println("  " + prose(sources));
      console.out().println("  " + prose(targets));
    }
  }

  private static List<Segment> sentences(List<Segment> segments, int from, int to) {
    List<Segment> sentences = new ArrayList<>(to - from);
    for (Segment segment : segments.subList(from, to)) {
      if (!segment.verbatim()) {
        sentences.add(segment);
      }
    }
    return sentences;
  }

  private static Span span(List<Segment> segments) {
    return segments.isEmpty()
        ? null
        : segments.get(0).span().cover(segments.get(segments.size() - 1).span());
  }

  private static String prose(List<Segment> segments) {
    return segments.isEmpty()
        ? "-"
        : segments.stream().map(Segment::prose).collect(Collectors.joining(" / "));
  }
}
