package dev.tallystick.lsp;

import java.util.List;
import java.util.concurrent.CompletableFuture;
import org.eclipse.lsp4j.TextDocumentPositionParams;
import org.eclipse.lsp4j.jsonrpc.services.JsonRequest;
import org.eclipse.lsp4j.jsonrpc.services.JsonSegment;

/** What a client can ask beyond the protocol. */
@JsonSegment("tallystick")
interface OwnRequests {
  /** What stands for the sentence at a place, in each pair of the file, sorted by language. */
  @JsonRequest
  CompletableFuture<List<Placed>> counterpart(TextDocumentPositionParams params);
}
