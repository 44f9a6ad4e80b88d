package dev.tallystick.engine;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The headings of a file as a tree. */
final class Outline {
  private final List<Section> sections;
  private final List<Tally> tallies;
  private int next;

  private Outline(List<Section> sections, List<Tally> tallies) {
    this.sections = sections;
    this.tallies = tallies;
  }

  /** The headings that are in no section of another, in order. */
  static List<Heading> of(List<Settled> pairs, Path file) {
    if (pairs.isEmpty()) {
      return List.of();
    }
    List<Section> sections = Section.of(pairs.get(0).reading(file));
    List<Tally> tallies = pairs.stream().map(pair -> pair.tally(file)).toList();
    return new Outline(sections, tallies).before(Integer.MAX_VALUE);
  }

  /** The next headings, each with those inside it, that stand before a segment. */
  private List<Heading> before(int end) {
    List<Heading> headings = new ArrayList<>();
    while (next < sections.size() && sections.get(next).from() < end) {
      Section section = sections.get(next++);
      headings.add(
          new Heading(
              section.title(),
              section.heading().extent(),
              section.span(),
              tallies.stream().map(tally -> tally.of(section)).toList(),
              before(section.to())));
    }
    return headings;
  }
}
