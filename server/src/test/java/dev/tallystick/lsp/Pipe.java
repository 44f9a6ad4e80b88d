package dev.tallystick.lsp;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.util.Arrays;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;

/** What is written at one end is read at the other, by any threads. */
final class Pipe {
  private static final byte[] END = new byte[0];

  private final BlockingQueue<byte[]> chunks = new LinkedBlockingQueue<>();

  final OutputStream out =
      new OutputStream() {
        @Override
        public void write(int b) {
          chunks.add(new byte[] {(byte) b});
        }

        @Override
        public void write(byte[] bytes, int from, int length) {
          if (length > 0) {
            chunks.add(Arrays.copyOfRange(bytes, from, from + length));
          }
        }

        @Override
        public void close() {
          chunks.add(END);
        }
      };

  final InputStream in =
      new InputStream() {
        private byte[] chunk = new byte[0];
        private int at;
        private boolean ended;

        @Override
        public int read() throws IOException {
          byte[] one = new byte[1];
          return read(one, 0, 1) < 0 ? -1 : one[0] & 0xFF;
        }

        @Override
        public int read(byte[] bytes, int from, int length) throws IOException {
          if (length == 0) {
            return 0;
          }
          if (at == chunk.length && !ended) {
            chunk = take();
            at = 0;
            ended = chunk == END;
          }
          if (ended) {
            return -1;
          }
          int count = Math.min(length, chunk.length - at);
          System.arraycopy(chunk, at, bytes, from, count);
          at += count;
          return count;
        }

        private byte[] take() throws IOException {
          try {
            return chunks.take();
          } catch (InterruptedException e) {
            throw new IOException(e);
          }
        }
      };
}
