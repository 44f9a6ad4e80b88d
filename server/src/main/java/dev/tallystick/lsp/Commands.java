package dev.tallystick.lsp;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import dev.tallystick.engine.Event;
import dev.tallystick.engine.Loop;
import dev.tallystick.engine.Summary;
import dev.tallystick.pairing.Language;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.ExecuteCommandParams;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.services.LanguageClient;

/** What a client can have done, by a command of the user. */
final class Commands {
  private static final String PAIR = "tallystick.pair";
  private static final String FINISHED = "tallystick.finished";
  private static final String DRAFT = "tallystick.draft";
  private static final String CHECK_FOLDER = "tallystick.checkFolder";

  /** Their names. */
  static final List<String> NAMES = List.of(PAIR, FINISHED, DRAFT, CHECK_FOLDER);

  private final Requests requests;
  private Loop loop;
  private LanguageClient remote;

  Commands(Requests requests) {
    this.requests = requests;
  }

  /** The session has begun. */
  void begin(Loop with, LanguageClient at) {
    loop = with;
    remote = at;
  }

  /**
   * Does what a command says.
   *
   * @throws ResponseErrorException if it is unknown, or its arguments are wrong
   */
  CompletableFuture<Object> execute(ExecuteCommandParams params) {
    requests.check();
    JsonElement argument = argument(params.getArguments());
    switch (String.valueOf(params.getCommand())) {
      case PAIR -> loop.post(paired(argument));
      case FINISHED -> loop.post(new Event.Marked(text(argument), true));
      case DRAFT -> loop.post(new Event.Marked(text(argument), false));
      case CHECK_FOLDER -> {
        return checkFolder(folder(argument));
      }
      default -> throw wrong("Unknown command: " + params.getCommand() + ".");
    }
    return CompletableFuture.completedFuture(null);
  }

  private static JsonElement argument(List<Object> arguments) {
    return new Gson()
        .toJsonTree(arguments == null || arguments.isEmpty() ? null : arguments.get(0));
  }

  private static Event paired(JsonElement argument) {
    if (!(argument instanceof JsonObject pair)) {
      throw wrong(PAIR + " takes an object with the URIs of a source and a target.");
    }
    Path source = text(pair.get("source"));
    Path target = text(pair.get("target"));
    if (source.equals(target)) {
      throw wrong("A file cannot be its own translation. Choose two files.");
    }
    return new Event.Paired(
        source, target, language(pair.get("sourceLanguage")), language(pair.get("targetLanguage")));
  }

  private static Path text(JsonElement uri) {
    return string(uri)
        .flatMap(Uris::text)
        .orElseThrow(() -> wrong("Name the file by its URI. Open it first, then try again."));
  }

  private static Optional<Language> language(JsonElement tag) {
    if (tag == null || tag.isJsonNull()) {
      return Optional.empty();
    }
    Optional<Language> language = string(tag).flatMap(Language::of);
    if (language.isEmpty()) {
      throw wrong(tag + " is no language tag. Take one such as en, de or pt-BR.");
    }
    return language;
  }

  private static Optional<Path> folder(JsonElement uri) {
    if (uri == null || uri.isJsonNull()) {
      return Optional.empty();
    }
    Optional<Path> folder = string(uri).flatMap(Uris::file);
    if (folder.isEmpty()) {
      throw wrong(CHECK_FOLDER + " takes the URI of a folder on this machine, or nothing.");
    }
    return folder;
  }

  private static Optional<String> string(JsonElement value) {
    return value instanceof JsonPrimitive one && one.isString()
        ? Optional.of(one.getAsString())
        : Optional.empty();
  }

  /** From now on all pairs of the folder are watched; the answer comes when all are examined. */
  private CompletableFuture<Object> checkFolder(Optional<Path> folder) {
    loop.post(new Event.FolderWanted(folder));
    return requests.askFolder(folder, known -> told(known.summary()));
  }

  private Object told(Summary summary) {
    remote.showMessage(new MessageParams(MessageType.Info, words(summary)));
    JsonObject findings = new JsonObject();
    summary.findings().forEach((code, count) -> findings.addProperty(code.word(), count));
    JsonObject answer = new JsonObject();
    answer.addProperty("pairs", summary.pairs());
    answer.add("findings", findings);
    return answer;
  }

  private static String words(Summary summary) {
    if (summary.pairs() == 0) {
      return "No pairs of files here: no source and translation were found that belong together.";
    }
    String pairs = summary.pairs() == 1 ? "1 pair" : summary.pairs() + " pairs";
    String found =
        switch (summary.total()) {
          case 0 -> "no findings. That says nothing about the meaning.";
          case 1 -> "1 finding.";
          default -> summary.total() + " findings.";
        };
    return pairs + " checked: " + found;
  }

  private static ResponseErrorException wrong(String message) {
    return Server.refused(ResponseErrorCode.InvalidParams, message);
  }
}
