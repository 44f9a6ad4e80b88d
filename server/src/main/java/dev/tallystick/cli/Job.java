package dev.tallystick.cli;

import dev.tallystick.align.Aligner;
import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Intake;
import dev.tallystick.engine.Listing;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.engine.TextRules;
import dev.tallystick.engine.Tongue;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Pair;
import dev.tallystick.pairing.Pairing;
import dev.tallystick.pairing.Pairs;
import dev.tallystick.pairing.Rules;
import dev.tallystick.project.Project;
import dev.tallystick.run.Cancellation;
import dev.tallystick.text.Decoded;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/**
 * The files that a command was given, and what belongs together among them. What cannot be read is
 * told at once on the error console; the rest goes on.
 */
final class Job {
  private final Console console;
  private final Pairs pairs;
  private final Listing files;
  private final Map<Pair, Project> projects;
  private final Map<Pair, NamedRules> rules;
  private String lastSource = "";
  private Reading lastReading;
  private boolean complete = true;

  private Job(
      Console console,
      Pairs pairs,
      Listing files,
      Map<Pair, Project> projects,
      Map<Pair, NamedRules> rules) {
    this.console = console;
    this.pairs = pairs;
    this.files = files;
    this.projects = projects;
    this.rules = rules;
  }

  /**
   * A folder or several, or one source and one translation.
   *
   * @throws Refused if the paths are none of these
   */
  static Job of(Console console, List<Path> paths, Rules rules) {
    for (Path path : paths) {
      if (!Files.exists(path)) {
        throw new Refused(path + ": there is no such file or folder. Check the name.");
      }
    }
    if (paths.stream().allMatch(Files::isDirectory)) {
      return ofFolders(console, paths, rules);
    }
    if (paths.size() == 2 && paths.stream().noneMatch(Files::isDirectory)) {
      String source = Listing.name(paths.get(0));
      String target = Listing.name(paths.get(1));
      List<Pair> pair = List.of(Pairing.named(source, target, rules));
      Pairs pairs = new Pairs(pair, List.of(), List.of());
      Listing files = Listing.of(paths, UnaryOperator.identity());
      return new Job(console, pairs, files, Map.of(), Map.of());
    }
    throw new Refused("Name one folder, or one source file and one translation.");
  }

  /**
   * What is in folders.
   *
   * @throws Refused if one cannot be listed
   */
  static Job ofFolders(Console console, List<Path> folders, Rules options) {
    Folders found = Folders.of(console, folders, options);
    Job job = new Job(console, found.pairs(), found.files(), found.projects(), found.rules());
    job.complete = found.complete();
    return job;
  }

  Pairs pairs() {
    return pairs;
  }

  /** Whether all files could be read so far. */
  boolean complete() {
    return complete;
  }

  /** The results of a pair; null if one of its files cannot be read. */
  PairResult result(Pair pair, Aligner aligner, boolean draft) {
    try {
      Reading source = source(pair);
      Reading target = read(pair, pair.target(), pair.targetLanguage());
      return PairResult.of(source, target, aligner, draft, Cancellation.NONE)
          .at(project(pair).levels());
    } catch (Unreadable e) {
      complete = false;
      console.err().println(e.getMessage());
      return null;
    }
  }

  /** Translations of one source follow each other, so the last reading is kept. */
  private Reading source(Pair pair) throws Unreadable {
    String key = pair.source() + " " + pair.sourceLanguage().tag();
    if (!key.equals(lastSource)) {
      lastReading = read(pair, pair.source(), pair.sourceLanguage());
      lastSource = key;
    }
    return lastReading;
  }

  private NamedRules rules(Pair pair) {
    return rules.getOrDefault(pair, NamedRules.NONE);
  }

  private Project project(Pair pair) {
    return projects.getOrDefault(pair, Project.NONE);
  }

  private Reading read(Pair pair, String file, Language language) throws Unreadable {
    NamedRules borders = rules(pair);
    TextRules texts = new TextRules(borders.srx(), project(pair).frontMatter());
    Path path = files.file(file);
    Decoded decoded = Intake.load(Disk.REAL, path);
    complete &= !Malformed.tell(console, file, decoded);
    Reading read =
        Reading.of(
            decoded.text(), Intake.format(path), Tongue.of(language), texts, Cancellation.NONE);
    borders.tell(console, read.endless());
    complete &= read.endless().isEmpty();
    return read;
  }
}
