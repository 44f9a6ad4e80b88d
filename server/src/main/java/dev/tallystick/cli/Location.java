package dev.tallystick.cli;

import dev.tallystick.text.Place;
import dev.tallystick.text.Text;

/**
 * A place for people.
 *
 * @param line counted from 1
 * @param column UTF-16 units, counted from 1
 */
record Location(int line, int column) {
  static Location of(Text text, int offset) {
    Place place = text.place(offset);
    return new Location(place.line() + 1, place.column() + 1);
  }

  @Override
  public String toString() {
    return line + ":" + column;
  }
}
