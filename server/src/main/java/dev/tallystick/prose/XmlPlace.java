package dev.tallystick.prose;

/**
 * Where in an XML document a text stands.
 *
 * @param context what blocks there are
 * @param edge how the innermost element around it stands in the text around that
 * @param flows whether elements that nothing is known of are parts of sentences here
 * @param sections how many sections it is in
 * @param titled whether a title here is that of a section
 * @param said what ITS says
 */
record XmlPlace(
    MarkupContext context, Edge edge, boolean flows, int sections, boolean titled, Its.Said said) {

  /** How an element stands in the text around it. */
  enum Edge {
    /** As a part of a sentence. */
    INLINE,
    /** As a part of a sentence with white space before it. */
    PARTED,
    /** As a part of a sentence with white space around it. */
    SPACED,
    /** As a block of its own. */
    BORDER,
    /** As a note that the sentence is read without. */
    ASIDE
  }
}
