package dev.tallystick.prose;

import dev.tallystick.text.Span;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.List;

/**
 * Subtitles: SubRip, and WebVTT as the W3C describes it (from memory). The text of the cues is
 * prose. A sentence that runs over several cues is in one block, which takes in these cues; a block
 * begins where a cue has ended a sentence, where somebody else speaks, at a sound in brackets or a
 * line of a song, behind a longer silence, and at another place on the screen.
 */
final class Subtitles {
  /** Where fewer cues than one in so many end as a sentence does, each one stands for itself. */
  private static final int FEWEST_STOPS = 6;

  private final String file;
  private final List<Block> blocks = new ArrayList<>();
  private boolean joins;

  /**
   * The block that is being read: its start, its prose, its times, its last line, and who speaks in
   * it.
   */
  private int start;

  private Pieces pieces;
  private List<Timed> timed;
  private CueLine last;
  private String voice;

  private Subtitles(String file) {
    this.file = file;
  }

  static List<Block> blocks(Text text) {
    Subtitles subtitles = new Subtitles(text.string());
    List<Cue> cues = CueReader.cues(text);
    subtitles.read(cues);
    List<Inline> inlines = new ArrayList<>();
    cues.forEach(cue -> CueTags.addTo(inlines, text.string(), cue));
    return Inline.spread(subtitles.blocks, inlines);
  }

  private void read(List<Cue> cues) {
    List<List<CueLine>> texts = new ArrayList<>();
    int stops = 0;
    for (Cue cue : cues) {
      List<CueLine> lines = cue.lines().stream().map(line -> CueLine.of(file, cue, line)).toList();
      stops += !lines.isEmpty() && lines.get(lines.size() - 1).stops() ? 1 : 0;
      texts.add(lines);
    }
    joins = stops * FEWEST_STOPS >= cues.size();
    for (int i = 0; i < texts.size(); i++) {
      texts.get(i).forEach(this::add);
      if (cues.get(i).isLandmark()) {
        close();
        Span extent = new Span(cues.get(i).start(), cues.get(i).end());
        blocks.add(new Block(Block.Kind.VERBATIM, 0, extent, List.of()));
      }
    }
    close();
  }

  private void add(CueLine line) {
    boolean goesOn = last != null && goesOnIn(line);
    if (!line.hasWords() && !(goesOn && line.cue() == last.cue())) {
      return;
    }
    if (goesOn) {
      pieces.addLineBreak(pieces.end(), line.span().start());
    } else {
      int begin = last == null || line.cue() != last.cue() ? line.cue().start() : -1;
      close();
      start = begin >= 0 ? begin : line.span().start();
      pieces = new Pieces(file);
      timed = new ArrayList<>();
      voice = "";
    }
    line.pieces().forEach(piece -> pieces.add(piece.start(), piece.end()));
    if (line.cue().times() != null) {
      timed.add(new Timed(line.span(), line.cue().times()));
    }
    voice = line.voice().isEmpty() ? voice : line.voice();
    last = line;
  }

  private boolean goesOnIn(CueLine line) {
    if (line.dash()
        || line.isAside()
        || last.isAside()
        || !line.voice().isEmpty() && !line.voice().equals(voice)) {
      return false;
    }
    return line.cue() == last.cue()
        || joins && last.goesOnIn(line) && last.cue().leadsTo(line.cue());
  }

  private void close() {
    if (last != null) {
      Span extent = new Span(start, last.span().end());
      blocks.add(new Block(Block.Kind.PARAGRAPH, 0, extent, pieces.spans(), timed));
      last = null;
    }
  }
}
