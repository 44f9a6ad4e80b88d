package dev.tallystick.lsp;

import org.eclipse.lsp4j.ProgressParams;
import org.eclipse.lsp4j.WorkDoneProgressBegin;
import org.eclipse.lsp4j.WorkDoneProgressCreateParams;
import org.eclipse.lsp4j.WorkDoneProgressEnd;
import org.eclipse.lsp4j.WorkDoneProgressNotification;
import org.eclipse.lsp4j.WorkDoneProgressReport;
import org.eclipse.lsp4j.jsonrpc.messages.Either;
import org.eclipse.lsp4j.services.LanguageClient;

/**
 * Shows the client how far a look at many pairs has come. Called by the loop; the client's consent
 * comes on the thread that reads messages, so this is the one place with a lock, held for no longer
 * than a message takes to be queued.
 */
final class PassReport {
  private final LanguageClient remote;
  private int number;
  private boolean running;
  private boolean shown;
  private int percent;

  PassReport(LanguageClient remote) {
    this.remote = remote;
  }

  /** So many pairs of so many are done; all of them at the end. */
  synchronized void pass(int done, int total) {
    if (!running && done < total) {
      running = true;
      number++;
      int current = number;
      remote
          .createProgress(new WorkDoneProgressCreateParams(token()))
          .thenRun(() -> begin(current));
    }
    int now = 100 * done / total;
    if (shown && now != percent) {
      WorkDoneProgressReport report = new WorkDoneProgressReport();
      report.setMessage(done + " of " + total + " pairs");
      report.setPercentage(now);
      report.setCancellable(true);
      tell(report);
    }
    percent = now;
    if (done == total) {
      end();
    }
  }

  private synchronized void begin(int of) {
    if (running && of == number) {
      shown = true;
      WorkDoneProgressBegin begin = new WorkDoneProgressBegin();
      begin.setTitle("Matching sentences");
      begin.setCancellable(true);
      begin.setPercentage(percent);
      tell(begin);
    }
  }

  private void end() {
    if (shown) {
      tell(new WorkDoneProgressEnd());
    }
    running = false;
    shown = false;
  }

  /** Whether the client means the look that is under way. */
  synchronized boolean is(Either<String, Integer> token) {
    return running && token != null && token().equals(token);
  }

  private Either<String, Integer> token() {
    return Either.forLeft("tallystick-pass-" + number);
  }

  private void tell(WorkDoneProgressNotification what) {
    remote.notifyProgress(new ProgressParams(token(), Either.forLeft(what)));
  }
}
