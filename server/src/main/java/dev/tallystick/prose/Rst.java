package dev.tallystick.prose;

import dev.tallystick.text.Text;
import java.util.List;

/**
 * reStructuredText as docutils reads it, with the directives and roles of Sphinx (from memory).
 * What docutils refuses, such as half a table, is read as far as it goes, since somebody may be
 * about to write the rest.
 */
final class Rst {
  private Rst() {}

  static List<Block> blocks(Text text) {
    RstBlocks blocks = new RstBlocks(text.string());
    new RstBody(blocks, RstLine.all(text), 0, RstPlace.DOCUMENT, 0).read();
    return List.copyOf(blocks.all());
  }
}
