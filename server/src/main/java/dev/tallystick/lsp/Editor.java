package dev.tallystick.lsp;

import dev.tallystick.engine.Audience;
import dev.tallystick.engine.Publication;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.services.LanguageClient;

/** The client, as the engine sees it. */
record Editor(LanguageClient remote, Conversion conversion, Report report) implements Audience {
  /** Shows how far a look at many pairs has come. */
  interface Report {
    void pass(int done, int total);
  }

  @Override
  public void pass(int done, int total) {
    report.pass(done, total);
  }

  @Override
  public void publish(Publication publication) {
    remote.publishDiagnostics(conversion.diagnostics(publication));
  }

  @Override
  public void say(String message) {
    remote.showMessage(new MessageParams(MessageType.Info, message));
  }

  @Override
  public void log(String line) {
    remote.logMessage(new MessageParams(MessageType.Log, line));
  }
}
