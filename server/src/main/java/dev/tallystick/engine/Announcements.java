package dev.tallystick.engine;

import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Language;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;

/** What the loop says, to the user or to the log. */
final class Announcements {
  private static final int MOST_FILES = 3;

  private Announcements() {}

  static String lost(Path file) {
    return file.getFileName()
        + ": the editor and Tallystick no longer agree on the text of this file, so nothing is"
        + " checked in it. Please close and reopen the file.";
  }

  static String unreadable(Path file) {
    return file.getFileName()
        + ": there is no such text file, so it cannot be paired. Check the name.";
  }

  static String alone(Path file) {
    return file.getFileName()
        + ": this file is in no pair that is watched, so it cannot be marked."
        + " Open it, or pair it with its source, then try again.";
  }

  static String choice(Ambiguity question) {
    List<String> files = question.files();
    String more = files.size() > MOST_FILES ? " and " + (files.size() - MOST_FILES) + " more" : "";
    return "Choose the source language: which of "
        + files.stream().limit(MOST_FILES).collect(Collectors.joining(", "))
        + more
        + " is the source cannot be told."
        + " Set \"sourceLanguage\" in tallystick.json or tallystick.sourceLanguage to one of: "
        + question.choices().stream().map(Language::tag).collect(Collectors.joining(", "))
        + ".";
  }

  static String fault(FilePair files, String fault) {
    return "A fault of Tallystick itself in the pair "
        + files.source().getFileName()
        + ", "
        + files.target().getFileName()
        + ": "
        + fault;
  }

  static String fault(Folder folder, String fault) {
    return "A fault of Tallystick itself while listing " + folder.path() + ": " + fault;
  }
}
