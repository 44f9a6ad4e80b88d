package dev.tallystick.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Which folders count, and which files belong to which. */
class WorkspaceTest {
  private static final Path JOB = Path.of("/job").toAbsolutePath();
  private static final Path INNER = JOB.resolve("inner");

  private final Workspace workspace = new Workspace();

  private void list(Path folder, String... names) {
    Root root =
        workspace.roots().stream()
            .filter(one -> one.folder().path().equals(folder))
            .findFirst()
            .orElseThrow();
    root.request(true);
    workspace.listed(folder, List.of(names).stream().map(folder::resolve).toList());
  }

  private List<String> pairs() {
    return workspace.pairs().stream()
        .map(pair -> JOB.relativize(pair.source()) + " " + JOB.relativize(pair.target()))
        .toList();
  }

  @Test
  void onlyPairsWithAnOpenSideAreWanted() {
    workspace.change(List.of(JOB), List.of());
    list(JOB, "en/a.md", "de/a.md", "en/b.md", "de/b.md");
    assertEquals(List.of(), pairs());

    workspace.open(Set.of(JOB.resolve("de/a.md")));
    assertEquals(List.of("en/a.md de/a.md"), pairs());
  }

  @Test
  void aFileBelongsToTheInnermostFolder() {
    workspace.change(List.of(JOB, INNER), List.of());
    workspace.open(Set.of(INNER.resolve("a.de.md"), JOB.resolve("a.fr.md")));
    list(JOB, "a.md", "a.fr.md", "inner/a.md", "inner/a.de.md");
    list(INNER, "a.md", "a.de.md");

    assertEquals(List.of("a.md a.fr.md", "inner/a.md inner/a.de.md"), pairs());
  }

  @Test
  void theFolderOfAFileOutsideCountsWhileItIsOpen() {
    workspace.open(Set.of(JOB.resolve("a.md")));
    assertEquals(List.of(new Folder(JOB, 2)), folders());

    workspace.open(Set.of());
    assertEquals(List.of(), folders());
  }

  @Test
  void aFileThatAnOutsideFolderHoldsAlreadyMakesNoOther() {
    workspace.open(Set.of(JOB.resolve("a.md")));
    list(JOB, "a.md", "de/a.md");
    workspace.open(Set.of(JOB.resolve("a.md"), JOB.resolve("de/a.md")));
    assertEquals(List.of(new Folder(JOB, 2)), folders());

    workspace.open(Set.of(JOB.resolve("de/a.md")));
    assertEquals(List.of("a.md de/a.md"), pairs());
  }

  @Test
  void theEditorsFolderComesBeforeThatOfAFile() {
    workspace.open(Set.of(INNER.resolve("a.md")));
    workspace.change(List.of(JOB), List.of());
    assertEquals(List.of(new Folder(JOB, Folder.DEEP)), folders());
  }

  private List<Folder> folders() {
    return workspace.roots().stream().map(Root::folder).toList();
  }

  @Test
  void whoWaitsForTheFilesDoesNotWaitForThoseThatComeMeanwhile() {
    Root root = new Root(new Folder(JOB, Folder.DEEP));
    assertTrue(root.begin());
    assertFalse(root.request(false));
    assertTrue(root.listed(List.of()), "once more");
    assertFalse(root.awaited());

    assertFalse(root.request(true));
    assertTrue(root.listed(List.of()), "once more");
    assertTrue(root.awaited());
    assertFalse(root.listed(List.of()));
    assertFalse(root.awaited());
  }
}
