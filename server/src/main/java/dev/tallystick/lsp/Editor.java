package dev.tallystick.lsp;

import dev.tallystick.engine.Audience;
import dev.tallystick.engine.Publication;
import dev.tallystick.engine.Standing;
import org.eclipse.lsp4j.MessageParams;
import org.eclipse.lsp4j.MessageType;
import org.eclipse.lsp4j.PublishDiagnosticsParams;

/** The client, as the engine sees it. */
final class Editor implements Audience {
  private final Remote remote;
  private final Conversion conversion;
  private final Board board;
  private final Views views;
  private final PassReport pass;
  private final Refresh findings;

  Editor(Remote remote, Conversion conversion, Board board, Views views, PassReport pass) {
    this.remote = remote;
    this.conversion = conversion;
    this.board = board;
    this.views = views;
    this.pass = pass;
    Client client = conversion.client();
    this.findings =
        new Refresh(
            () -> client.pulls() && client.refreshesFindings() && board.takeNews(),
            remote::refreshDiagnostics);
  }

  /** Some clients are sent findings, others ask for them: no client gets both. */
  @Override
  public void publish(Publication publication) {
    PublishDiagnosticsParams params = conversion.diagnostics(publication);
    board.post(params);
    if (!conversion.client().pulls()) {
      remote.publishDiagnostics(params);
    }
  }

  @Override
  public void stands(Standing standing) {
    views.stands(standing);
    if (conversion.client().wantsProgress()) {
      remote.stands(PairProgress.of(standing));
    }
  }

  @Override
  public void pass(int done, int total) {
    if (conversion.client().showsProgress()) {
      pass.pass(done, total);
    }
  }

  @Override
  public void turned() {
    findings.check();
    views.check();
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
