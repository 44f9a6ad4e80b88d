package dev.tallystick.cli;

import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Intake;
import dev.tallystick.engine.Listing;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.segment.Srx;
import dev.tallystick.segment.SrxFile;
import dev.tallystick.text.Decoded;
import dev.tallystick.text.Problem;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The rules for sentence borders that a project names.
 *
 * @param name the file as it is told of
 * @param text what stands in it
 * @param srx what that says
 * @param told what was told of it already
 */
record NamedRules(String name, Text text, Srx srx, Set<Problem> told) {
  /** Of a project that names none. */
  static final NamedRules NONE = new NamedRules("", new Text(""), Srx.NONE, Set.of());

  /**
   * Reads a file, and tells what is wrong in it.
   *
   * @throws Unreadable if it cannot be read
   */
  static NamedRules read(Console console, Path file) throws Unreadable {
    Decoded decoded = Intake.load(Disk.REAL, file);
    String name = Listing.name(file.normalize());
    Malformed.tell(console, name, decoded);
    SrxFile read = SrxFile.of(decoded.text());
    NamedRules rules = new NamedRules(name, decoded.text(), read.rules(), new HashSet<>());
    rules.told.addAll(decoded.problems());
    rules.tell(console, read.problems());
    return rules;
  }

  /** Tells what is wrong in it and was not told yet. */
  void tell(Console console, List<Problem> problems) {
    Malformed.tell(console, name, text, problems.stream().filter(told::add).toList());
  }

  /** Whether nothing is wrong in it, as far as is known. */
  boolean sound() {
    return told.isEmpty();
  }
}
