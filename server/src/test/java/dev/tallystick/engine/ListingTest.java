package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The way from a file to its name and back. */
class ListingTest {
  private static final Path JOB = Path.of("/job").toAbsolutePath();

  @TempDir Path folder;

  /** Lists a folder, in a program of its own. */
  static final class Program {
    private Program() {}

    /** Prints the pairs in the folder, and whether their files can be read. */
    public static void main(String[] arguments) throws Unreadable {
      Path folder = Path.of(arguments[0]);
      List<Path> files = Disk.REAL.files(folder);
      Workspace workspace = new Workspace();
      workspace.change(List.of(folder), List.of());
      workspace.listed(folder, files);
      workspace.open(files);
      for (FilePair pair : workspace.pairs()) {
        System.out.println(Files.exists(pair.source()) + " " + Files.exists(pair.target()));
      }
      System.out.println(Listing.of(files, folder::relativize).names().size());
    }
  }

  @Test
  void aNameLeadsBackToItsFile() {
    Path file = JOB.resolve("de").resolve("a.md");
    Listing listing = Listing.of(List.of(file), JOB::relativize);

    assertEquals(Set.of("de/a.md"), listing.names());
    assertEquals(file, listing.file("de/a.md"));
    assertThrows(IllegalArgumentException.class, () -> listing.file("de/b.md"));
  }

  @Test
  void aBackslashIsALetterWhereItSeparatesNothing() {
    Path path = Path.of("a\\b.md");
    assertEquals(path.getNameCount() == 1 ? "a\\b.md" : "a/b.md", Listing.name(path));
  }

  @Test
  void aNameThatIsNoTextIsStillThatFile() {
    Path source = Path.of(URI.create("file:///job/F%FFhre.en.md"));
    Path target = Path.of(URI.create("file:///job/F%FFhre.de.md"));
    Path other = Path.of(URI.create("file:///job/F%FEhre.fr.md"));
    Workspace workspace = new Workspace();
    workspace.change(List.of(source.getParent()), List.of());
    workspace.open(Set.of(source));
    workspace.listed(source.getParent(), List.of(source, target, other));

    List<FilePair> pairs = workspace.pairs();
    assertEquals(1, pairs.size());
    assertEquals(source, pairs.get(0).source());
    assertEquals(target, pairs.get(0).target());
  }

  @Test
  void aNameThatTheLocaleCannotExpressIsPairedAllTheSame() throws Exception {
    Files.writeString(folder.resolve("Fähre.en.md"), "A ferry.");
    Files.writeString(folder.resolve("Fähre.de.md"), "Eine Fähre.");
    Files.writeString(folder.resolve("Führe.fr.md"), "Un bac.");

    assertEquals("true true\n3\n", inTheLocaleC(folder));
  }

  private static String inTheLocaleC(Path folder) throws IOException, InterruptedException {
    Path java = Path.of(System.getProperty("java.home"), "bin", "java");
    String classes = System.getProperty("java.class.path");
    ProcessBuilder builder =
        new ProcessBuilder(
            java.toString(), "-cp", classes, Program.class.getName(), folder.toString());
    builder.environment().put("LC_ALL", "C");
    builder.redirectErrorStream(true);
    Process process = builder.start();
    String told = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertEquals(0, process.waitFor(), told);
    assertFalse(told.isEmpty());
    assertTrue(told.endsWith("\n"), told);
    return told;
  }
}
