package dev.tallystick.editors;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.tidy.Repository;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/**
 * A place where an editor runs a script of ours, with a home of its own.
 *
 * @param folder for all that the editor and the server leave behind
 * @param job the folder of the job
 */
record Desk(Path folder, Path job) {
  private static final int SECONDS = 240;

  /** Runs the server as it was called to be run, and keeps what passes. */
  private static final String TAP =
      """
      #!/bin/sh
      tee '%1$s/to-server' | sh -c 'echo $$ > %1$s/pid; exec %2$s "$@"' java "$@" | tee '%1$s/to-editor'
      """;

  static String java() {
    return Path.of(System.getProperty("java.home"), "bin", "java").toString();
  }

  static String jar() {
    return Repository.root().resolve("server/target/tallystick.jar").toString();
  }

  /** The set-up that README shows in a language, with a tapped server of this build. */
  Path snippet(String language) throws IOException {
    Path tap = folder.resolve("tap");
    Files.writeString(tap, TAP.formatted(folder, java()));
    assertTrue(tap.toFile().setExecutable(true));
    String shown =
        readme(language)
            .replace("/path/to/tallystick.jar", jar())
            .replace("\"java\"", "\"" + tap + "\"");
    return Files.writeString(folder.resolve("snippet"), shown);
  }

  /** What README shows in a language. */
  static String readme(String language) {
    String readme = Repository.read(Repository.root().resolve("README.md"));
    int from = readme.indexOf("```" + language + "\n") + "```\n".length() + language.length();
    return readme.substring(from, readme.indexOf("```", from));
  }

  /** Where the scripts are. */
  static Path scripts() throws Exception {
    return Path.of(Desk.class.getResource("/editors/translator.lua").toURI()).getParent();
  }

  /** Runs an editor; its script must see all that it waits for. */
  void run(List<String> command, Map<String, String> more) throws Exception {
    ProcessBuilder builder = new ProcessBuilder(command);
    Map<String, String> environment = builder.environment();
    environment.putAll(more);
    environment.put("JOB", job.toRealPath().toString());
    environment.put("SCRIPTS", scripts().toString());
    environment.put("TOLD", told().toString());
    environment.put("LANG", "C.UTF-8");
    environment.put("LC_ALL", "C.UTF-8");
    environment.put("TERM", "xterm");
    environment.put("HOME", Files.createDirectories(folder.resolve("home")).toString());
    for (String kind : List.of("CONFIG", "DATA", "STATE", "CACHE")) {
      environment.put("XDG_" + kind + "_HOME", folder.resolve("home/" + kind).toString());
    }
    Process process = builder.redirectErrorStream(true).redirectOutput(log().toFile()).start();
    boolean ended = process.waitFor(SECONDS, TimeUnit.SECONDS);
    if (!ended) {
      process.descendants().forEach(ProcessHandle::destroyForcibly);
      process.destroyForcibly().waitFor();
    }
    assertTrue(ended, () -> "The editor did not end.\n" + seen());
    assertTrue(read(told()).endsWith("all seen\n"), this::seen);
    assertEquals(0, process.exitValue(), this::seen);
  }

  /** Waits until the tapped server has ended too. */
  void awaitEndOfServer() throws Exception {
    long pid = Long.parseLong(read(folder.resolve("pid")).strip());
    var server = ProcessHandle.of(pid);
    if (server.isPresent()) {
      server.get().onExit().get(SECONDS, TimeUnit.SECONDS);
    }
  }

  /** What the editor sent through the tap. */
  Wire toServer() throws IOException {
    return Wire.of(Files.readAllBytes(folder.resolve("to-server")));
  }

  /** What the server sent through the tap. */
  Wire toEditor() throws IOException {
    return Wire.of(Files.readAllBytes(folder.resolve("to-editor")));
  }

  private Path told() {
    return folder.resolve("told.txt");
  }

  private Path log() {
    return folder.resolve("editor.log");
  }

  private String seen() {
    return read(told()) + read(log());
  }

  private static String read(Path file) {
    return Files.exists(file) ? Repository.read(file) : "(no " + file.getFileName() + ")\n";
  }
}
