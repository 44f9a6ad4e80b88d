package dev.tallystick.lsp;

import org.eclipse.lsp4j.jsonrpc.services.JsonNotification;
import org.eclipse.lsp4j.services.LanguageClient;

/** A client, with what it is told beyond the protocol. */
interface Remote extends LanguageClient {
  /** A pair has come so far. Only for a client that has asked for it. */
  @JsonNotification("tallystick/progress")
  void stands(PairProgress progress);
}
