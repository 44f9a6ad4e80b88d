package dev.tallystick.cli;

import java.io.Closeable;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.RandomAccessFile;
import java.net.InetAddress;
import java.net.Socket;
import java.net.UnixDomainSocketAddress;
import java.nio.ByteBuffer;
import java.nio.channels.SocketChannel;
import java.nio.file.InvalidPathException;

/**
 * A way to talk to an editor on this machine.
 *
 * @param in what the editor says
 * @param out what it is told
 * @param end closes both
 */
record Connection(InputStream in, OutputStream out, Closeable end) implements Closeable {
  private static final String WINDOWS_PIPE = "\\\\.\\pipe\\";

  /** Connects to a port where the editor listens. */
  static Connection toPort(int port) throws IOException {
    Socket socket = new Socket(InetAddress.getLoopbackAddress(), port);
    socket.setTcpNoDelay(true);
    return new Connection(socket.getInputStream(), socket.getOutputStream(), socket);
  }

  /** Connects to a named pipe of Windows, or to a socket file. */
  static Connection toPipe(String name) throws IOException {
    if (name.startsWith(WINDOWS_PIPE)) {
      RandomAccessFile pipe = new RandomAccessFile(name, "rw");
      return new Connection(
          new FileInputStream(pipe.getFD()), new FileOutputStream(pipe.getFD()), pipe);
    }
    try {
      SocketChannel channel = SocketChannel.open(UnixDomainSocketAddress.of(name));
      return new Connection(new ChannelInput(channel), new ChannelOutput(channel), channel);
    } catch (InvalidPathException | UnsupportedOperationException e) {
      throw new IOException(e.getMessage(), e);
    }
  }

  @Override
  public void close() throws IOException {
    end.close();
  }

  /** Reads a channel. The library's own stream would lock out the writer while it waits. */
  private static final class ChannelInput extends InputStream {
    private final SocketChannel channel;

    ChannelInput(SocketChannel channel) {
      this.channel = channel;
    }

    @Override
    public int read() throws IOException {
      byte[] one = new byte[1];
      return read(one, 0, 1) < 0 ? -1 : one[0] & 0xFF;
    }

    @Override
    public int read(byte[] bytes, int from, int length) throws IOException {
      return channel.read(ByteBuffer.wrap(bytes, from, length));
    }
  }

  /** Writes a channel. */
  private static final class ChannelOutput extends OutputStream {
    private final SocketChannel channel;

    ChannelOutput(SocketChannel channel) {
      this.channel = channel;
    }

    @Override
    public void write(int b) throws IOException {
      write(new byte[] {(byte) b}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int from, int length) throws IOException {
      ByteBuffer left = ByteBuffer.wrap(bytes, from, length);
      while (left.hasRemaining()) {
        channel.write(left);
      }
    }
  }
}
