package dev.tallystick.cli;

import dev.tallystick.pairing.Ambiguity;
import dev.tallystick.pairing.Language;
import java.util.stream.Collectors;

/** What to say where the source of some files cannot be told. */
final class Choice {
  private Choice() {}

  static String message(Ambiguity ambiguity) {
    String choices =
        ambiguity.choices().stream().map(Language::tag).collect(Collectors.joining(", "));
    return String.join(", ", ambiguity.files())
        + ": which of these is the source cannot be told. Choose with --source-language: "
        + choices
        + ". Or set \"sourceLanguage\" in tallystick.json.";
  }
}
