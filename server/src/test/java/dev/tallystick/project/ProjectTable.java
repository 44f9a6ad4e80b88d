package dev.tallystick.project;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.PairRule;
import dev.tallystick.prose.FrontMatterKeys;
import dev.tallystick.text.Place;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * A file with what is wrong in it marked below each line, and what counts of it below {@code =>}. A
 * {@code +} behind the marks says that the place goes on in the next lines:
 *
 * <pre>
 * { "colour": "red", "ignore": ["old"] }
 *   ^^^^^^^^ "colour" means nothing here. ...
 * =&gt;
 * ignore old
 * </pre>
 */
final class ProjectTable {
  private static final Pattern MARKS = Pattern.compile(" *\\^+\\+? .*");

  private ProjectTable() {}

  static void check(String table) {
    String[] halves = table.split("(?m)^=>\n", 2);
    String json =
        halves[0]
            .lines()
            .filter(line -> !MARKS.matcher(line).matches())
            .collect(Collectors.joining("\n"));
    assertEquals(table, print(json));
    assertEquals(table, print(json.replace("\n", "\r\n")).replace("\r", ""));
    ProjectFile plain = ProjectFile.of(new Text(json));
    ProjectFile marked = ProjectFile.of(new Text("\uFEFF" + json));
    assertEquals(plain.project(), marked.project());
    assertEquals(plain.problems().stream().map(ProjectTable::oneLater).toList(), marked.problems());
  }

  private static Problem oneLater(Problem problem) {
    Span span = problem.span();
    return new Problem(new Span(span.start() + 1, span.end() + 1), problem.message());
  }

  private static String print(String json) {
    Text text = new Text(json);
    ProjectFile file = ProjectFile.of(text);
    StringBuilder out = new StringBuilder();
    for (int line = 0; line < text.lines(); line++) {
      out.append(json, text.lineStart(line), text.lineEnd(line)).append('\n');
      for (Problem problem : file.problems()) {
        if (text.place(problem.span().start()).line() == line) {
          out.append(marks(text, problem)).append('\n');
        }
      }
    }
    return out.append("=>\n").append(facts(file.project())).toString();
  }

  private static String marks(Text text, Problem problem) {
    Place start = text.place(problem.span().start());
    int lineEnd = text.lineEnd(start.line());
    boolean more = problem.span().end() > lineEnd;
    int length = (more ? lineEnd : problem.span().end()) - problem.span().start();
    return " ".repeat(start.column())
        + "^".repeat(length)
        + (more ? "+ " : " ")
        + problem.message().replaceAll("[\u2068\u2069]", ""); // unseen, so no table shows them
  }

  private static String facts(Project project) {
    List<String> lines = new ArrayList<>();
    project.sourceLanguage().ifPresent(language -> lines.add("source " + language.tag()));
    for (PairRule rule : project.pairs()) {
      lines.add(
          "pair "
              + rule.source()
              + in(rule.sourceLanguage())
              + " -> "
              + rule.target()
              + in(rule.targetLanguage()));
    }
    project
        .levels()
        .changed()
        .forEach(
            (code, level) ->
                lines.add("check " + code.word() + " " + level.map(l -> l.word()).orElse("off")));
    lines.subList(lines.size() - project.levels().changed().size(), lines.size()).sort(null);
    project.segmentation().ifPresent(file -> lines.add("segmentation " + file));
    if (!project.frontMatter().equals(FrontMatterKeys.USUAL)) {
      lines.add("front matter " + new TreeSet<>(project.frontMatter().names()));
    }
    project.ignored().forEach(glob -> lines.add("ignore " + glob));
    return lines.stream().map(line -> line + "\n").collect(Collectors.joining());
  }

  private static String in(Optional<Language> language) {
    return language.map(one -> " (" + one.tag() + ")").orElse("");
  }
}
