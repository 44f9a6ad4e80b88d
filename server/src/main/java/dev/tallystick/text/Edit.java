package dev.tallystick.text;

/**
 * One replacement in a text.
 *
 * @param span what goes, in the text before the edit
 * @param replacement what comes in its place
 */
public record Edit(Span span, String replacement) {
  /**
   * Where an offset of the text before lies in the text after. What lay inside the replaced stretch
   * ends up behind the replacement.
   */
  public int map(int offset) {
    if (offset < span.start()) {
      return offset;
    }
    int shift = replacement.length() - span.length();
    return offset >= span.end() ? offset + shift : span.start() + replacement.length();
  }
}
