package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.Hover;
import org.eclipse.lsp4j.InitializeParams;
import org.eclipse.lsp4j.LocationLink;
import org.eclipse.lsp4j.WorkspaceFolder;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Questions in the order of the queue: which text they see, and how long they wait. */
class QuestionSessionTest {
  @TempDir Path folder;
  private Work work;

  @BeforeEach
  void work() {
    work = Work.withoutFog(folder);
  }

  @Test
  void aQuestionBehindAnEditSeesTheTextAfterIt() {
    try (Talk talk = Talk.in(folder)) {
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      talk.settle();
      german.type("# Die Kettenfähre\n", "# Die Kettenfähre\n\nVon Zeile zu Zeile.\n");
      LocationLink there = german.jump("410 Gliedern");

      assertEquals(JumpSessionTest.WINCH_DE, german.words(there.getOriginSelectionRange()));
    }
  }

  @Test
  void aQuestionWaitsForTheResultOfItsText() {
    try (Talk talk = Talk.in(folder)) {
      talk.machine.hold();
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      CompletableFuture<Hover> asked = german.ask("410 Gliedern");
      talk.barrier();
      assertFalse(asked.isDone());

      talk.machine.release();
      assertEquals(JumpSessionTest.WINCH_EN, JumpSessionTest.text(Talk.answer(asked)));
    }
  }

  @Test
  void aQuestionWaitsUntilItIsKnownWhichFilesThereAre() {
    try (Talk talk = Talk.silent()) {
      talk.machine.holdListing();
      InitializeParams params = Talk.params();
      params.setWorkspaceFolders(List.of(new WorkspaceFolder(folder.toUri().toString(), "work")));
      talk.begin(params);
      Buffer german = talk.open(work.de(), Ferry.DE_WITHOUT_FOG);
      CompletableFuture<Hover> asked = german.ask("410 Gliedern");
      talk.barrier();
      talk.machine.release();

      assertEquals(JumpSessionTest.WINCH_EN, JumpSessionTest.text(Talk.answer(asked)));
      talk.settle();
      assertEquals(1, talk.all(german.uri).size());
    }
  }
}
