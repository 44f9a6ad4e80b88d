package dev.tallystick.prose;

import java.util.List;
import java.util.function.Predicate;
import org.jsoup.nodes.Attribute;
import org.jsoup.nodes.Element;

/**
 * A selector of ITS rules: which elements or attributes it selects is found on the way down the
 * tree, with no look back, so that many rules over a large file take no longer than they must.
 *
 * @param steps from the root; none of a path that selects the attributes of any element
 * @param attributes which attributes of the last step are meant; {@code null} if elements are
 * @param deep whether attributes below the last step are meant too
 */
record ItsPath(List<Step> steps, Predicate<Attribute> attributes, boolean deep) {
  /** More would not go into the bits of a number. */
  static final int MOST_STEPS = 62;

  /**
   * One step.
   *
   * @param anywhere whether it may lie at any depth below the one before, not only right in it
   */
  record Step(boolean anywhere, Predicate<Element> test) {}

  /**
   * How far the steps have come, bit by bit: bit i is set if the first i steps lead there.
   *
   * @param here to this element
   * @param above to this element or one around it
   */
  record Reached(long here, long above) {
    static final Reached START = new Reached(1, 1);
  }

  /** How far they have come in an element. */
  Reached in(Reached around, Element element) {
    long here = 0;
    for (int i = 0; i < steps.size(); i++) {
      long from = steps.get(i).anywhere() ? around.above() : around.here();
      if ((from >> i & 1) != 0 && steps.get(i).test().test(element)) {
        here |= 1L << i + 1;
      }
    }
    return new Reached(here, around.above() | here);
  }

  /** Whether an element is selected. */
  boolean selects(Reached reached) {
    return attributes == null && (reached.here() >> steps.size() & 1) != 0;
  }

  /** Whether an attribute of an element is selected. */
  boolean selects(Reached reached, Attribute attribute) {
    long from = deep ? reached.above() : reached.here();
    return attributes != null && (from >> steps.size() & 1) != 0 && attributes.test(attribute);
  }
}
