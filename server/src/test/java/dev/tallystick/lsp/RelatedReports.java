package dev.tallystick.lsp;

import com.google.gson.GsonBuilder;
import com.google.gson.JsonDeserializationContext;
import com.google.gson.JsonDeserializer;
import com.google.gson.JsonElement;
import com.google.gson.reflect.TypeToken;
import java.lang.reflect.Type;
import org.eclipse.lsp4j.FullDocumentDiagnosticReport;
import org.eclipse.lsp4j.UnchangedDocumentDiagnosticReport;
import org.eclipse.lsp4j.jsonrpc.messages.Either;

/** Reads the findings of related files. lsp4j 1.0.0 writes them, but cannot tell the two kinds. */
final class RelatedReports {
  private static final Type EITHER =
      new TypeToken<
          Either<FullDocumentDiagnosticReport, UnchangedDocumentDiagnosticReport>>() {}.getType();

  private RelatedReports() {}

  static void teach(GsonBuilder gson) {
    gson.registerTypeAdapter(EITHER, (JsonDeserializer<?>) RelatedReports::report);
  }

  private static Object report(JsonElement json, Type type, JsonDeserializationContext context) {
    boolean full = json.getAsJsonObject().get("kind").getAsString().equals("full");
    return full
        ? Either.forLeft(context.deserialize(json, FullDocumentDiagnosticReport.class))
        : Either.forRight(context.deserialize(json, UnchangedDocumentDiagnosticReport.class));
  }
}
