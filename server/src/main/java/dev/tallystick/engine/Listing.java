package dev.tallystick.engine;

import java.io.File;
import java.net.URI;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Collections;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.UnaryOperator;

/**
 * Files, and the names by which they are told apart and paired. The way back from a name goes
 * through this list: where the program runs in a locale without the letters of a file's name, no
 * path can be made of that name.
 */
public final class Listing {
  private static final char UNREADABLE = '\uFFFD';

  private final TreeMap<String, Path> files = new TreeMap<>();

  private Listing() {}

  /**
   * Lists files.
   *
   * @param naming the path that a file is named by: a part of its own, or the same made simple
   */
  public static Listing of(Collection<Path> files, UnaryOperator<Path> naming) {
    Listing listing = new Listing();
    files.forEach(file -> listing.files.putIfAbsent(name(naming.apply(file)), file));
    return listing;
  }

  /** The names, sorted, with slashes between folders. */
  public Set<String> names() {
    return Collections.unmodifiableSet(files.keySet());
  }

  /**
   * The file of a name.
   *
   * @throws IllegalArgumentException if it is none of {@link #names()}
   */
  public Path file(String name) {
    Path file = files.get(name);
    if (file == null) {
      throw new IllegalArgumentException("not listed");
    }
    return file;
  }

  /** A path as a name, with slashes between folders. */
  public static String name(Path path) {
    String name = path.toString();
    if (name.indexOf(UNREADABLE) >= 0) {
      return rewritten(path);
    }
    return File.separatorChar == '/' ? name : name.replace(File.separatorChar, '/');
  }

  /** A name that the locale cannot express, from its bytes. */
  private static String rewritten(Path path) {
    StringBuilder name = new StringBuilder(path.isAbsolute() ? "/" : "");
    String between = "";
    for (Path part : path) {
      String plain = part.toString();
      name.append(between);
      name.append(plain.indexOf(UNREADABLE) < 0 ? plain : fromBytes(part.toUri()));
      between = "/";
    }
    return name.toString();
  }

  private static String fromBytes(URI uri) {
    String path = uri.getRawPath();
    String folderless = path.endsWith("/") ? path.substring(0, path.length() - 1) : path;
    String escaped = folderless.substring(folderless.lastIndexOf('/') + 1);
    return decoded(escaped);
  }

  /** What the escaped bytes mean in UTF-8; as it is if they mean nothing. */
  private static String decoded(String escaped) {
    ByteBuffer bytes = ByteBuffer.allocate(escaped.length());
    for (int i = 0; i < escaped.length(); i++) {
      boolean escape = escaped.charAt(i) == '%';
      bytes.put((byte) (escape ? Integer.parseInt(escaped, i + 1, i + 3, 16) : escaped.charAt(i)));
      i += escape ? 2 : 0;
    }
    try {
      return StandardCharsets.UTF_8.newDecoder().decode(bytes.flip()).toString();
    } catch (CharacterCodingException e) {
      return escaped;
    }
  }
}
