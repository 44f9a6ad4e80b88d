package dev.tallystick.cli;

import dev.tallystick.engine.Machine;
import dev.tallystick.lsp.Session;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The language server. */
@Command(
    name = "serve",
    mixinStandardHelpOptions = true,
    description = "Starts the language server, which an editor talks to.",
    exitCodeListHeading = "Exit codes:%n",
    exitCodeList = {
      "0:the editor asked to shut down",
      "1:the editor was gone without asking",
      "2:bad usage, or nobody to connect to"
    })
final class ServeCommand implements Callable<Integer> {
  private static final int HIGHEST_PORT = 65_535;

  /** The editor was gone without asking. */
  private static final int UNASKED = 1;

  @Spec private CommandSpec command;

  @ArgGroup(exclusive = true, multiplicity = "0..1")
  private Channel channel;

  private Optional<ProcessHandle> editor = Optional.empty();
  private boolean editorGone;

  /** How the editor is reached. */
  static final class Channel {
    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    @Option(names = "--stdio", description = "Talk over standard input and output (the default).")
    private boolean stdio;

    private Integer port;

    @Option(
        names = "--pipe",
        paramLabel = "NAME",
        description = "Connect to the editor's pipe or socket file of this name.")
    private String pipe;

    @Option(
        names = "--socket",
        paramLabel = "PORT",
        description = "Connect to the editor's port on this machine.")
    void setPort(int number) {
      if (number < 1 || number > HIGHEST_PORT) {
        throw new ParameterException(
            command.commandLine(), "--socket takes a port from 1 to " + HIGHEST_PORT + ".");
      }
      port = number;
    }
  }

  @Option(
      names = "--clientProcessId",
      paramLabel = "N",
      description = "End when the process with this number does.")
  void setClientProcessId(long number) {
    if (number < 1) {
      throw new ParameterException(
          command.commandLine(), "--clientProcessId takes the number of a process, from 1 on.");
    }
    editor = ProcessHandle.of(number);
    editorGone = editor.isEmpty();
  }

  @Override
  public Integer call() throws Exception {
    if (editorGone) {
      return UNASKED;
    }
    try (Connection connection = connect()) {
      CompletableFuture<Integer> session =
          Session.start(connection.in(), connection.out(), Machine.real(), Version.number());
      editor.ifPresent(process -> process.onExit().thenRun(() -> session.complete(UNASKED)));
      return session.get();
    }
  }

  private Connection connect() {
    try {
      if (channel != null && channel.port != null) {
        return Connection.toPort(channel.port);
      }
      if (channel != null && channel.pipe != null) {
        return Connection.toPipe(channel.pipe);
      }
      return stdio();
    } catch (IOException e) {
      throw new Refused(
          "The editor cannot be reached (" + e.getMessage() + "). Is it listening there?");
    }
  }

  /** Standard output is the editor's alone: whatever else is printed goes to standard error. */
  private static Connection stdio() {
    Connection connection =
        new Connection(
            new FileInputStream(FileDescriptor.in),
            new FileOutputStream(FileDescriptor.out),
            () -> {});
    System.setOut(System.err);
    return connection;
  }
}
