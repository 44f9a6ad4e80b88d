package dev.tallystick.engine;

import dev.tallystick.text.Span;
import java.util.List;

/**
 * A heading of a file, with how much of its section is matched.
 *
 * @param title its prose
 * @param span the heading itself, its marks included
 * @param section the heading and all below it, up to the next of the same or a higher level
 * @param counts the sentences of the section, in each pair of the file
 * @param inside the headings of the sections inside, in order
 */
public record Heading(
    String title, Span span, Span section, List<Count> counts, List<Heading> inside) {
  /** Keeps the lists unchangeable. */
  public Heading {
    counts = List.copyOf(counts);
    inside = List.copyOf(inside);
  }
}
