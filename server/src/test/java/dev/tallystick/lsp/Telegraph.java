package dev.tallystick.lsp;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.TimeUnit;

/** A client that sends whatever bytes it likes, and keeps the messages that come. */
final class Telegraph implements AutoCloseable {
  private static final long FAR_TOO_LONG = 60;
  private static final String CALL = "call ";

  final Surround machine = new Surround();
  final CompletableFuture<Integer> ended;
  private final Pipe toServer = new Pipe();
  private final Pipe toClient = new Pipe();
  private final List<JsonObject> came = new ArrayList<>();
  private final Map<String, CompletableFuture<Void>> calls = new ConcurrentHashMap<>();
  private int called;

  Telegraph() {
    ended = Session.start(toServer.in, toClient.out, machine.machine(), "0.0-test");
    Thread reader = new Thread(this::read, "telegraph");
    reader.setDaemon(true);
    reader.start();
  }

  /** The bytes of a message with its header. */
  static byte[] frame(byte[] body) {
    byte[] head = ("Content-Length: " + body.length + "\r\n\r\n").getBytes(StandardCharsets.UTF_8);
    ByteArrayOutputStream frame = new ByteArrayOutputStream();
    frame.writeBytes(head);
    frame.writeBytes(body);
    return frame.toByteArray();
  }

  void send(byte[] bytes) {
    try {
      toServer.out.write(bytes);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  void hangUp() {
    try {
      toServer.out.close();
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  /** All that has come since, once the server has done all that was sent. */
  List<JsonObject> take() {
    for (int i = 0; i < 2; i++) { // the server may have been told more meanwhile
      call();
      await(machine.activity.idle());
    }
    call();
    synchronized (came) {
      List<JsonObject> taken = List.copyOf(came);
      came.clear();
      return taken;
    }
  }

  /** Waits until the server has read all that was sent, and its loop has handled it. */
  void call() {
    called++;
    CompletableFuture<Void> answered = new CompletableFuture<>();
    calls.put(CALL + called, answered);
    String hover =
        """
        {"jsonrpc":"2.0","id":"%s","method":"textDocument/hover","params":\
        {"textDocument":{"uri":"file:///nobody/knows.md"},"position":{"line":0,"character":0}}}"""
            .formatted(CALL + called);
    send(frame(hover.getBytes(StandardCharsets.UTF_8)));
    await(answered);
  }

  /** Waits, unless the session is over: then nothing more comes. */
  private void await(CompletableFuture<Void> awaited) {
    CompletableFuture.anyOf(awaited, ended).orTimeout(FAR_TOO_LONG, TimeUnit.SECONDS).join();
  }

  private void read() {
    try {
      while (true) {
        int length = 0;
        for (String line = line(); !line.isEmpty(); line = line()) {
          length = Integer.parseInt(line.replaceFirst("Content-Length: ", ""));
        }
        byte[] body = toClient.in.readNBytes(length);
        keep(JsonParser.parseString(new String(body, StandardCharsets.UTF_8)).getAsJsonObject());
      }
    } catch (IOException e) {
      // Nothing comes any more.
    }
  }

  private String line() throws IOException {
    ByteArrayOutputStream line = new ByteArrayOutputStream();
    for (int b = toClient.in.read(); b != '\n'; b = toClient.in.read()) {
      if (b < 0) {
        throw new IOException("the end");
      }
      line.write(b);
    }
    return line.toString(StandardCharsets.UTF_8).strip();
  }

  private void keep(JsonObject message) {
    String id = message.has("id") ? message.get("id").toString().replace("\"", "") : "";
    CompletableFuture<Void> call = message.has("method") ? null : calls.remove(id);
    if (call != null) {
      call.complete(null);
      return;
    }
    synchronized (came) {
      came.add(message);
    }
  }

  @Override
  public void close() {
    machine.release();
    hangUp();
    ended.orTimeout(FAR_TOO_LONG, TimeUnit.SECONDS).join();
    try {
      toClient.out.close();
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }
}
