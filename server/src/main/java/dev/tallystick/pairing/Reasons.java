package dev.tallystick.pairing;

/** Why a file stands alone, in the translator's words. */
final class Reasons {
  private Reasons() {}

  /** Nothing is tagged with a language, neither this file nor one like it. */
  static String noTag(String path) {
    return "No other file is called " + bareName(path) + " with a language in its name or folder.";
  }

  /** The file has a tag, but nothing to go with it. */
  static String noSibling(Tagged reading) {
    return "\""
        + reading.written()
        + "\" looks like a language, but no other language of this file exists.";
  }

  /** All that the file could go with belongs to others. */
  static String siblingsTaken() {
    return "The files that it could belong to are already matched with others.";
  }

  /** The settings want other languages only. */
  static String unwanted(Language language, Language wanted) {
    return "It is in "
        + language.name()
        + ", but only translations into "
        + wanted.name()
        + " are asked for.";
  }

  /** A source whose translations were all unwanted. */
  static String noTranslation(Language wanted) {
    return "No translation of it into " + wanted.name() + " exists.";
  }

  /** A second file in the language of the source. */
  static String secondSource(Language language, String source) {
    return "It is in " + language.name() + " like " + source + ", which is the source already.";
  }

  /** A second file that the project states to be a source. */
  static String secondSource(String source) {
    return source + " is the source already.";
  }

  /** The project states the file to belong to one that is not there. */
  static String noStatedFile(String other) {
    return "tallystick.json pairs it with " + other + ", and there is no such file.";
  }

  /** The project does not want the file to count. */
  static String ignored(Glob glob) {
    return "tallystick.json ignores it by \"" + glob + "\".";
  }

  /** A file without a tag where a tagged one is the source. */
  static String unknownLanguage(String source) {
    return "Nothing tells its language, and " + source + " is the source already.";
  }

  private static String bareName(String path) {
    String name = path.substring(path.lastIndexOf('/') + 1);
    int dot = name.lastIndexOf('.');
    return dot > 0 ? name.substring(0, dot) : name;
  }
}
