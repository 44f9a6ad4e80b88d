package dev.tallystick.tidy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The main code keeps to the table of packages in DEVELOPERS.md. */
class ImportsTest {
  private static final String BASE = "dev.tallystick.";

  /** An import, or the full name of a class of ours or of a library anywhere in the code. */
  private static final Pattern NAME =
      Pattern.compile(
          "^import (?:static )?([\\w.]+)|(?<![\\w.\"])((?:dev\\.tallystick|com|org|picocli)\\.[\\w.]+)",
          Pattern.MULTILINE);

  private final ImportTable table =
      ImportTable.of(Repository.read(Repository.root().resolve("DEVELOPERS.md")));

  @Test
  void everyPackageHasARowAndEveryRowAPackage() {
    Set<String> packages = new TreeSet<>();
    for (Path file : Repository.files(Repository.main(), ".java")) {
      packages.add(packageOf(file));
    }
    assertEquals(packages, new TreeSet<>(table.rows().keySet()));
  }

  @Test
  void noImportBreaksTheTable() {
    List<String> broken = new ArrayList<>();
    for (Path file : Repository.files(Repository.main(), ".java")) {
      for (String name : foreign(packageOf(file), Repository.code(file))) {
        broken.add(Repository.shown(file) + " uses " + name);
      }
    }
    assertEquals(List.of(), broken);
  }

  /** The check itself, on made-up code: what a package may not use is seen. */
  @ParameterizedTest
  @CsvSource({
    "text, import dev.tallystick.align.Match;, dev.tallystick.align.Match",
    "text, import dev.tallystick.run.Clock;, ''",
    "text, import dev.tallystick.text.Span;, ''",
    "text, import java.util.List;, ''",
    "text, import static dev.tallystick.check.Code.OMISSION;, dev.tallystick.check.Code.OMISSION",
    "align, import dev.tallystick.text.Span;, dev.tallystick.text.Span",
    "check, import org.eclipse.lsp4j.Range;, org.eclipse.lsp4j.Range",
    "check, import com.ibm.icu.util.ULocale;, ''",
    "check, import org.unknown.Thing;, org.unknown.Thing",
    "check, import javax.swing.JFrame;, javax.swing.JFrame",
    "engine, '  org.eclipse.lsp4j.Range range;', org.eclipse.lsp4j.Range",
    "lsp, import dev.tallystick.cli.Console;, dev.tallystick.cli.Console"
  })
  void aForeignNameIsSeen(String own, String code, String foreign) {
    assertEquals(foreign, String.join(" ", foreign(own, code)));
  }

  @Test
  void onlyTheCommandLineStartsTheServer() {
    table
        .rows()
        .forEach((name, row) -> assertTrue(name.equals("cli") || !row.own().contains("lsp"), name));
  }

  private List<String> foreign(String own, String code) {
    List<String> foreign = new ArrayList<>();
    Matcher matcher = NAME.matcher(code.replaceAll("(?m)^package .*$", ""));
    while (matcher.find()) {
      String name = matcher.group(1) != null ? matcher.group(1) : matcher.group(2);
      if (!allowed(own, name)) {
        foreign.add(name);
      }
    }
    return foreign;
  }

  private boolean allowed(String own, String name) {
    ImportTable.Row row = table.rows().getOrDefault(own, new ImportTable.Row(Set.of(), Set.of()));
    if (name.startsWith(BASE)) {
      String used = name.substring(BASE.length()).replaceFirst("\\..*", "");
      return used.equals(own) || row.own().contains(used);
    }
    return name.startsWith("java.")
        || name.startsWith("javax.xml.")
        || row.outside().stream().anyMatch(name::startsWith);
  }

  private static String packageOf(Path file) {
    return Repository.main()
        .relativize(file.getParent())
        .toString()
        .replace('\\', '.')
        .replace('/', '.');
  }
}
