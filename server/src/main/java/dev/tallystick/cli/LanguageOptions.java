package dev.tallystick.cli;

import dev.tallystick.pairing.Language;
import dev.tallystick.pairing.Rules;
import java.util.Optional;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The languages of a pair or a folder. */
final class LanguageOptions {
  @Spec(Spec.Target.MIXEE)
  private CommandSpec command;

  private Optional<Language> source = Optional.empty();
  private Optional<Language> target = Optional.empty();

  @Option(
      names = "--source-language",
      paramLabel = "TAG",
      description = "Language of the source as a BCP 47 tag, such as en or zh-Hant.")
  void setSource(String tag) {
    source = Optional.of(language(command, tag));
  }

  @Option(
      names = "--target-language",
      paramLabel = "TAG",
      description = "Language of the translation; in a folder, only translations into it.")
  void setTarget(String tag) {
    target = Optional.of(language(command, tag));
  }

  Rules rules() {
    return new Rules(source, target);
  }

  /** The language that a tag on the command line stands for. */
  static Language language(CommandSpec command, String tag) {
    if (tag.equals(Language.UNKNOWN.tag())) {
      return Language.UNKNOWN;
    }
    return Language.of(tag)
        .orElseThrow(
            () ->
                new ParameterException(
                    command.commandLine(),
                    "\""
                        + tag
                        + "\" is no language tag that is known."
                        + " Use one such as en, de, pt-BR or zh-Hant."));
  }
}
