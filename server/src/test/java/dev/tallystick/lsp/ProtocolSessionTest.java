package dev.tallystick.lsp;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * What clients send, in order and out of it, whole and broken, and what comes of it: the sessions
 * in {@code lsp/sessions.txt}.
 */
class ProtocolSessionTest {
  @TempDir Path folder;

  /** Title and lines of each session. */
  static List<Arguments> sessions() throws IOException {
    try (InputStream in = ProtocolSessionTest.class.getResourceAsStream("/lsp/sessions.txt")) {
      String table =
          new String(in.readAllBytes(), StandardCharsets.UTF_8)
              .lines()
              .filter(line -> !line.matches("|#.*"))
              .collect(Collectors.joining("\n"));
      return Stream.of(table.split("(?m)^== "))
          .filter(session -> !session.isEmpty())
          .map(session -> session.lines().toList())
          .map(lines -> Arguments.of(lines.get(0), lines.subList(1, lines.size())))
          .toList();
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("sessions")
  void whatIsSentHasTheseAnswers(String title, List<String> lines) {
    try (Protocol protocol = new Protocol(Work.withoutFog(folder))) {
      protocol.play(lines);
    }
  }
}
