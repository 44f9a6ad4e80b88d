package dev.tallystick.lsp;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Reads the names that clients give to files. They differ in what they escape ({@code c%3A}, {@code
 * c:}; blanks, umlauts), so this takes more than a strict reader of URIs would.
 */
final class Uris {
  private static final String FILE = "file:";
  private static final Pattern DRIVE = Pattern.compile("/+[A-Za-z]:.*", Pattern.DOTALL);

  private static final Pattern SCHEME =
      Pattern.compile("[A-Za-z][A-Za-z0-9+.-]+:.*", Pattern.DOTALL);

  private Uris() {}

  /**
   * What a URI of a text is called inside: its file, or, for a buffer without a file such as {@code
   * untitled:1}, a relative path made of the URI, which is no file's.
   */
  static Optional<Path> text(String uri) {
    if (uri == null || uri.toLowerCase(Locale.ROOT).startsWith(FILE)) {
      return file(uri);
    }
    return SCHEME.matcher(uri).matches()
        ? Optional.of(Path.of(URLEncoder.encode(uri, StandardCharsets.UTF_8).replace("*", "%2A")))
        : Optional.empty();
  }

  /** The file that a URI names; empty if it names none on this machine, or is missing. */
  static Optional<Path> file(String uri) {
    if (uri == null || !uri.toLowerCase(Locale.ROOT).startsWith(FILE)) {
      return Optional.empty();
    }
    String path = uri.substring(FILE.length());
    if (path.startsWith("//")) {
      int slash = path.indexOf('/', 2);
      String host = slash < 0 ? path.substring(2) : path.substring(2, slash);
      boolean here = host.isEmpty() || host.equalsIgnoreCase("localhost");
      path = here ? path.substring(slash < 0 ? path.length() : slash) : path;
    }
    return path(unescape(path));
  }

  private static Optional<Path> path(String path) {
    boolean drive = File.separatorChar == '\\' && DRIVE.matcher(path).matches();
    try {
      Path found = Path.of(drive ? path.replaceFirst("^/+", "") : path);
      return found.isAbsolute() ? Optional.of(found.normalize()) : Optional.empty();
    } catch (InvalidPathException e) {
      return Optional.empty();
    }
  }

  /** Takes escapes for bytes of UTF-8; what is no escape stays as it is. */
  private static String unescape(String escaped) {
    byte[] bytes = escaped.getBytes(StandardCharsets.UTF_8);
    ByteArrayOutputStream out = new ByteArrayOutputStream(bytes.length);
    for (int i = 0; i < bytes.length; i++) {
      int value = bytes[i] == '%' && i + 2 < bytes.length ? hex(bytes[i + 1], bytes[i + 2]) : -1;
      out.write(value >= 0 ? value : bytes[i]);
      i += value >= 0 ? 2 : 0;
    }
    return out.toString(StandardCharsets.UTF_8);
  }

  private static int hex(byte high, byte low) {
    int h = Character.digit(high, 16);
    int l = Character.digit(low, 16);
    return h < 0 || l < 0 ? -1 : h * 16 + l;
  }
}
