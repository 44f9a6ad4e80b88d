package dev.tallystick.project;

import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * A {@code tallystick.json}, read. It is JSON by RFC 8259, with two slips that people make by
 * habit: comments, and a comma behind the last member. Those are told, and the rest counts as if
 * they were not there. Of a file that is broken otherwise, what stands before that place counts.
 *
 * @param project what it says, as far as it is right
 * @param problems what is wrong in it, by place; none if it can be taken as it is
 * @param segmentation where it names the file with rules for sentence borders, if it does
 */
public record ProjectFile(Project project, List<Problem> problems, Optional<Span> segmentation) {
  /** The name of the file. It counts at the root of a folder only. */
  public static final String NAME = "tallystick.json";

  /** Without a file. */
  public static final ProjectFile NONE = new ProjectFile(Project.NONE, List.of(), Optional.empty());

  private static final int LONGEST = 1_000_000;
  private static final int MOST_PROBLEMS = 100;

  /** Takes a copy. */
  public ProjectFile {
    problems = List.copyOf(problems);
  }

  /** Reads the text of a file, which may be anything; a byte-order mark is passed over. */
  public static ProjectFile of(Text text) {
    String string = text.string();
    if (string.length() > LONGEST) {
      return wrong(text, "The file is too long to be read: more than a million characters.");
    }
    if (string.replace("\uFEFF", "").isBlank()) {
      return wrong(text, "The file is empty. Write {} where nothing is to be set, or delete it.");
    }
    Slips slips = Slips.in(string);
    List<Problem> problems = new ArrayList<>(slips.problems());
    Tokens tokens = new Tokens(slips.amended());
    ProjectReader reader = new ProjectReader(new Values(tokens, problems));
    boolean whole = true;
    try {
      reader.read();
    } catch (IOException e) {
      whole = false;
      problems.add(tokens.fault(e));
    }
    Project project = reader.project(whole);
    problems.sort(Comparator.comparing(Problem::span));
    int told = Math.min(problems.size(), MOST_PROBLEMS);
    return new ProjectFile(project, problems.subList(0, told), reader.segmentation());
  }

  /** What to say if the named file with rules for sentence borders is not there. */
  public List<Problem> withoutRules() {
    String message =
        "There is no such file in the folder, or it cannot be read. Sentences end by our own rules.";
    return segmentation.stream().map(place -> new Problem(place, message)).toList();
  }

  /** All of it, as far as it can be shown, is wrong. */
  private static ProjectFile wrong(Text text, String message) {
    Span firstLine = new Span(0, text.lineEnd(0));
    return new ProjectFile(
        Project.NONE, List.of(new Problem(firstLine, message)), Optional.empty());
  }
}
