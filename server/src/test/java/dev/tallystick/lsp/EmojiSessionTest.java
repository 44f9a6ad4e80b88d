package dev.tallystick.lsp;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.eclipse.lsp4j.CodeLensParams;
import org.eclipse.lsp4j.DocumentHighlightParams;
import org.eclipse.lsp4j.DocumentSymbolParams;
import org.eclipse.lsp4j.HoverParams;
import org.eclipse.lsp4j.InlayHintParams;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.SelectionRangeParams;
import org.eclipse.lsp4j.TextDocumentIdentifier;
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.eclipse.lsp4j.services.TextDocumentService;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Texts whose sentences begin and end with characters outside of the basic plane: no position that
 * a client is told lies inside one, whatever it asks, and in whatever it counts.
 */
class EmojiSessionTest {
  private static final String EN = edged(Ferry.EN);
  private static final String DE = edged(Ferry.DE_WITHOUT_FOG);

  @TempDir Path folder;

  /** Each line between two boats, inside the marks of a heading. */
  private static String edged(String text) {
    return text.replaceAll("(?m)^(# )?(.*\\S)([.]?)$", "$1🛶$2🛶$3");
  }

  /** All positions in an answer that concern the file itself. */
  private static List<Position> positions(Object answer) {
    List<Position> found = new ArrayList<>();
    collect(new Gson().toJsonTree(answer), found);
    return found;
  }

  private static void collect(JsonElement json, List<Position> found) {
    if (json instanceof JsonObject object) {
      if (object.has("line") && object.has("character")) {
        found.add(new Position(object.get("line").getAsInt(), object.get("character").getAsInt()));
      }
      object.entrySet().stream()
          .filter(entry -> !entry.getKey().equals("relatedInformation"))
          .filter(entry -> !entry.getKey().equals("counterpart"))
          .forEach(entry -> collect(entry.getValue(), found));
    } else if (json.isJsonArray()) {
      json.getAsJsonArray().forEach(one -> collect(one, found));
    }
  }

  private static List<Object> answers(Talk talk, Buffer buffer, Position at) {
    TextDocumentService texts = talk.server.getTextDocumentService();
    TextDocumentIdentifier file = new TextDocumentIdentifier(buffer.uri);
    List<Object> answers = new ArrayList<>();
    answers.add(Talk.answer(texts.hover(new HoverParams(file, at))));
    answers.add(Talk.answer(texts.documentHighlight(new DocumentHighlightParams(file, at))));
    answers.add(Talk.answer(texts.selectionRange(new SelectionRangeParams(file, List.of(at)))));
    answers.add(Talk.answer(talk.server.counterpart(new TextDocumentPositionParams(file, at))));
    answers.add(Talk.answer(texts.documentSymbol(new DocumentSymbolParams(file))));
    answers.add(Talk.answer(texts.codeLens(new CodeLensParams(file))));
    answers.add(Talk.answer(texts.inlayHint(new InlayHintParams(file, ViewsSessionTest.ALL))));
    answers.add(talk.shown(buffer.uri));
    return answers;
  }

  @Test
  void noPositionLiesInsideACharacter() {
    Work work = new Work(folder);
    work.write("en/ferry.md", EN);
    work.write("de/ferry.md", DE);
    for (String encoding : List.of("utf-16", "utf-8")) {
      Encoding counts = encoding.equals("utf-8") ? Encoding.UTF_8 : Encoding.UTF_16;
      try (Talk talk =
          Talk.in(
              folder,
              params -> {
                params.setInitializationOptions(Map.of("lens", true, "inlay", true));
                LifecycleSessionTest.offer(params, encoding);
              })) {
        Buffer english = talk.open(work.en(), EN);
        Buffer german = talk.open(work.de(), DE);
        talk.settle();
        assertEquals(List.of("omission"), talk.codes(work.de()));
        check(talk, english, counts);
        check(talk, german, counts);
      }
    }
  }

  private static void check(Talk talk, Buffer buffer, Encoding counts) {
    Text text = new Text(buffer.text);
    int asked = 0;
    for (int line = 0; line < text.lines(); line++) {
      for (int column = 0; column <= 5; column++) {
        for (Object answer : answers(talk, buffer, new Position(line, column))) {
          for (Position position : positions(answer)) {
            asked++;
            // Inside a character or behind its line a position is moved by being read.
            int offset = counts.offset(text, position);
            boolean end = position.getLine() >= text.lines() - 1;
            assertTrue(
                end || position.equals(counts.position(text, offset)),
                () -> answer + " in " + counts);
          }
        }
      }
    }
    assertFalse(asked < 1000, "only " + asked + " positions were told");
  }
}
