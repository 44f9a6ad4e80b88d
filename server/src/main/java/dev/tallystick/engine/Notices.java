package dev.tallystick.engine;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.OnSide;
import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Turns the findings of a pair into what each of the two files shows. A finding is shown on its own
 * side, pointing at the other; one that has words for the other side too, an omission, is shown at
 * the gap there, pointing back.
 */
final class Notices {
  private final FilePair files;
  private final PairResult result;
  private final Uris uris;

  /**
   * For one state of a pair.
   *
   * @param uris how the editor names a file
   */
  Notices(FilePair files, PairResult result, Uris uris) {
    this.files = files;
    this.result = result;
    this.uris = uris;
  }

  /** What a side shows of some findings. */
  List<Notice> on(OnSide side, List<Finding> findings) {
    List<Notice> notices = new ArrayList<>();
    for (Finding finding : findings) {
      if (finding.side() == side) {
        notices.add(own(finding));
      } else if (!finding.counterMessage().isEmpty()) {
        place(finding).ifPresent(place -> notices.add(atCounterpart(finding, place)));
      }
    }
    return notices;
  }

  private Notice own(Finding finding) {
    OnSide other = finding.side().other();
    Optional<Notice.Related> related =
        place(finding).map(place -> related(other, place, counterWords(finding)));
    return notice(finding, finding.span(), finding.message(), related);
  }

  private Notice atCounterpart(Finding finding, Span place) {
    Notice.Related source = related(finding.side(), finding.span(), "The source sentence");
    return notice(finding, place, finding.counterMessage(), Optional.of(source));
  }

  private static Notice notice(
      Finding finding, Span span, String message, Optional<Notice.Related> related) {
    return new Notice(Optional.of(finding.code()), finding.severity(), span, message, related);
  }

  private static String counterWords(Finding finding) {
    if (!finding.counterMessage().isEmpty()) {
      return finding.counterMessage();
    }
    return finding.code() == Code.ADDITION ? "The gap" : "The source sentence";
  }

  /** The counterpart of a finding, or the word before the gap; empty in a file without words. */
  private Optional<Span> place(Finding finding) {
    Span counterpart = finding.counterpart();
    return counterpart.isEmpty()
        ? Gap.word(text(finding.side().other()).string(), counterpart.start())
        : Optional.of(counterpart);
  }

  private Notice.Related related(OnSide side, Span span, String message) {
    return new Notice.Related(uris.uri(files.file(side)), text(side), span, message);
  }

  private Text text(OnSide side) {
    return result.reading(side).text();
  }
}
