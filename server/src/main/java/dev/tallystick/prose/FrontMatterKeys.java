package dev.tallystick.prose;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The keys of front matter whose values are prose, at any depth.
 *
 * @param names as they are written; none if front matter has no prose
 */
public record FrontMatterKeys(Set<String> names) {
  /** What readers of a page get to see in most systems that know front matter. */
  public static final FrontMatterKeys USUAL =
      of(List.of("title", "subtitle", "description", "summary"));

  /** Takes a copy. */
  public FrontMatterKeys {
    names = Set.copyOf(names);
  }

  /** These; it does not matter if one comes twice. */
  public static FrontMatterKeys of(List<String> names) {
    return new FrontMatterKeys(new HashSet<>(names));
  }
}
