package dev.tallystick.pairing;

/**
 * One way to read a path: as the version of some file in some language.
 *
 * @param path the path as given
 * @param stem the path without the tag: what all versions share
 * @param language the tag's language; {@link Language#UNKNOWN} for the version without a tag, whose
 *     stem is the path itself
 * @param written the tag as it stands in the path
 * @param layout the path with a blank for the tag
 * @param position UTF-16 offset in the path at which the first tag is cut out
 * @param why where the tag was found
 */
record Tagged(
    String path,
    String stem,
    Language language,
    String written,
    String layout,
    int position,
    Why why) {

  /** The version without a tag. */
  static Tagged plain(String path) {
    return new Tagged(path, path, Language.UNKNOWN, "", path, path.length(), Why.NAME);
  }

  boolean isPlain() {
    return language.equals(Language.UNKNOWN);
  }
}
