package dev.tallystick.cli;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * Which findings make a check fail.
 *
 * @param codes the codes that do
 */
record FailOn(Set<Code> codes) {
  boolean fails(Finding finding) {
    return codes.contains(finding.code());
  }

  /** Reads a level, or a list of codes. */
  static final class Converter implements ITypeConverter<FailOn> {
    @Override
    public FailOn convert(String value) {
      if (value.equals("never")) {
        return new FailOn(Set.of());
      }
      for (Severity severity : Severity.values()) {
        if (severity.word().equals(value)) {
          return atLeast(severity);
        }
      }
      List<Code> codes = new ArrayList<>();
      for (String word : value.split(",")) {
        codes.add(Code.of(word.strip().toLowerCase(Locale.ROOT)).orElseThrow(() -> unknown(word)));
      }
      return new FailOn(Set.copyOf(codes));
    }

    private static FailOn atLeast(Severity severity) {
      List<Code> codes = new ArrayList<>();
      for (Code code : Code.values()) {
        if (code.severity().compareTo(severity) >= 0) {
          codes.add(code);
        }
      }
      return new FailOn(Set.copyOf(codes));
    }

    private static TypeConversionException unknown(String word) {
      String codes = Stream.of(Code.values()).map(Code::word).collect(Collectors.joining(", "));
      return new TypeConversionException(
          "\""
              + word
              + "\" is neither a level (hint, information, warning, never) nor a code ("
              + codes
              + ")");
    }
  }
}
