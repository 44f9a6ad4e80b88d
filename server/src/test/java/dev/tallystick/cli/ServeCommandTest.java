package dev.tallystick.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.Socket;
import java.net.StandardProtocolFamily;
import java.net.UnixDomainSocketAddress;
import java.nio.ByteBuffer;
import java.nio.channels.ServerSocketChannel;
import java.nio.channels.SocketChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** How the server is started, reached and ended. */
class ServeCommandTest {
  private static final String SESSION =
      frame("{'jsonrpc':'2.0','id':1,'method':'initialize','params':{'capabilities':{}}}")
          + frame("{'jsonrpc':'2.0','method':'initialized','params':{}}")
          + frame("{'jsonrpc':'2.0','id':2,'method':'shutdown'}")
          + frame("{'jsonrpc':'2.0','method':'exit'}");

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private static String frame(String json) {
    return "Content-Length: " + json.length() + "\r\n\r\n" + json.replace('\'', '"');
  }

  private int run(String... args) {
    return Tallystick.run(new Console(new PrintWriter(out), new PrintWriter(err), false), args);
  }

  private CompletableFuture<Integer> start(String... args) {
    return CompletableFuture.supplyAsync(() -> run(args)).orTimeout(60, TimeUnit.SECONDS);
  }

  private static void check(String answers) {
    assertTrue(answers.startsWith("Content-Length: "), answers);
    assertTrue(answers.contains("\"serverInfo\":{\"name\":\"Tallystick\""), answers);
    assertTrue(answers.contains("\"id\":2"), answers);
  }

  @Test
  void bySocketItConnectsToTheEditor() throws IOException {
    try (ServerSocket editor = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
      CompletableFuture<Integer> code =
          start("serve", "--socket", String.valueOf(editor.getLocalPort()));
      try (Socket connection = editor.accept()) {
        connection.getOutputStream().write(SESSION.getBytes(StandardCharsets.UTF_8));
        check(text(connection.getInputStream()));
      }
      assertEquals(0, code.join());
      assertEquals("", out.toString());
    }
  }

  @Test
  void byPipeItConnectsToTheEditor(@TempDir Path folder) throws IOException {
    Path name = folder.resolve("pipe");
    try (ServerSocketChannel editor = ServerSocketChannel.open(StandardProtocolFamily.UNIX)) {
      editor.bind(UnixDomainSocketAddress.of(name));
      CompletableFuture<Integer> code = start("serve", "--pipe", name.toString());
      try (SocketChannel connection = editor.accept()) {
        connection.write(ByteBuffer.wrap(SESSION.getBytes(StandardCharsets.UTF_8)));
        ByteBuffer answers = ByteBuffer.allocate(1 << 16);
        int read = connection.read(answers);
        while (read >= 0) {
          read = connection.read(answers);
        }
        check(new String(answers.array(), 0, answers.position(), StandardCharsets.UTF_8));
      }
      assertEquals(0, code.join());
    }
  }

  @Test
  void anEditorThatHangsUpEndsIt() throws IOException {
    try (ServerSocket editor = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
      CompletableFuture<Integer> code =
          start("serve", "--socket", String.valueOf(editor.getLocalPort()));
      editor.accept().close();
      assertEquals(1, code.join());
    }
  }

  @Test
  void anEditorsProcessThatEndsEndsIt() throws IOException {
    Process process = new ProcessBuilder("sort").start(); // waits for its input
    try (ServerSocket editor = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
      String port = String.valueOf(editor.getLocalPort());
      String number = String.valueOf(process.pid());
      CompletableFuture<Integer> code =
          start("serve", "--socket", port, "--clientProcessId", number);
      try (Socket connection = editor.accept()) {
        assertTrue(connection.isConnected());
        process.destroy();
        assertEquals(1, code.join());
      }
    }
  }

  @Test
  void anEditorsProcessThatIsGoneAlreadyEndsItAtOnce() throws Exception {
    Process process = new ProcessBuilder("sort").start();
    process.destroy();
    process.waitFor();
    assertEquals(1, run("serve", "--clientProcessId", String.valueOf(process.pid())));
  }

  @Test
  void overStandardStreamsNothingElseIsPrinted() throws Exception {
    Process server = server("serve", "--stdio");
    try (OutputStream in = server.getOutputStream()) {
      in.write(SESSION.getBytes(StandardCharsets.UTF_8));
      in.flush();
      String answers = text(server.getInputStream());
      check(answers);
      while (!answers.isEmpty()) {
        int head = answers.indexOf("\r\n\r\n");
        int length = Integer.parseInt(answers.substring("Content-Length: ".length(), head));
        answers = answers.substring(head + 4 + length); // ASCII only, so units are bytes
      }
      assertEquals("", text(server.getErrorStream()));
      assertEquals(0, server.waitFor());
    }
  }

  private static Process server(String... args) throws IOException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of("-cp", System.getProperty("java.class.path")));
    command.add(Tallystick.class.getName());
    command.addAll(List.of(args));
    return new ProcessBuilder(command).start();
  }

  private static String text(InputStream in) throws IOException {
    return new String(in.readAllBytes(), StandardCharsets.UTF_8);
  }

  @Test
  void aPortThatIsNoneIsRefused() {
    assertEquals(2, run("serve", "--socket", "0"));
    assertTrue(err.toString().startsWith("--socket takes a port from 1 to 65535."));
    assertEquals(2, run("serve", "--socket", "65536"));
    assertEquals(2, run("serve", "--socket", "editor"));
  }

  @Test
  void moreThanOneWayIsRefused() {
    assertEquals(2, run("serve", "--stdio", "--socket", "4000"));
    assertTrue(err.toString().contains("--stdio"), err.toString());
    assertEquals(2, run("serve", "--pipe", "x", "--socket", "4000"));
  }

  @Test
  void aProcessNumberThatIsNoneIsRefused() {
    assertEquals(2, run("serve", "--clientProcessId", "0"));
    assertTrue(err.toString().startsWith("--clientProcessId takes the number of a process"));
    assertEquals(2, run("serve", "--clientProcessId", "editor"));
  }

  @Test
  void whereNobodyListensItSaysSo(@TempDir Path folder) throws IOException {
    int port;
    try (ServerSocket nobody = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
      port = nobody.getLocalPort();
    }
    assertEquals(2, run("serve", "--socket", String.valueOf(port)));
    assertTrue(err.toString().startsWith("The editor cannot be reached ("), err.toString());
    assertEquals(2, run("serve", "--pipe", folder.resolve("nobody").toString()));
    Files.writeString(folder.resolve("file"), "no socket");
    assertEquals(2, run("serve", "--pipe", folder.resolve("file").toString()));
  }
}
