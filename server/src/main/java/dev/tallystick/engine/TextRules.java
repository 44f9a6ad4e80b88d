package dev.tallystick.engine;

import dev.tallystick.prose.FrontMatterKeys;
import dev.tallystick.segment.Srx;

/**
 * What a project says of how its texts are read.
 *
 * @param borders its rules for sentence borders
 * @param frontMatter the keys of front matter whose values are prose
 */
public record TextRules(Srx borders, FrontMatterKeys frontMatter) {
  /** Of a project that says nothing. */
  public static final TextRules USUAL = new TextRules(Srx.NONE, FrontMatterKeys.USUAL);
}
