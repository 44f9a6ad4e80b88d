package dev.tallystick.cli;

import dev.tallystick.check.Code;
import dev.tallystick.check.Finding;
import dev.tallystick.check.Severity;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * Which findings make a check fail.
 *
 * @param least those that are said at least so loudly, if a level counts
 * @param codes the codes that count, whatever their level
 */
record FailOn(Optional<Severity> least, Set<Code> codes) {
  boolean fails(Finding finding) {
    boolean loud = least.filter(level -> finding.severity().compareTo(level) >= 0).isPresent();
    return loud || codes.contains(finding.code());
  }

  /** Reads a level, or a list of codes. */
  static final class Converter implements ITypeConverter<FailOn> {
    @Override
    public FailOn convert(String value) {
      if (value.equals("never")) {
        return new FailOn(Optional.empty(), Set.of());
      }
      Optional<Severity> least = Severity.of(value);
      if (least.isPresent()) {
        return new FailOn(least, Set.of());
      }
      List<Code> codes = new ArrayList<>();
      for (String word : value.split(",")) {
        codes.add(Code.of(word.strip().toLowerCase(Locale.ROOT)).orElseThrow(() -> unknown(word)));
      }
      return new FailOn(Optional.empty(), Set.copyOf(codes));
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
