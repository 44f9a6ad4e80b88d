package dev.tallystick.prose;

import dev.tallystick.text.Span;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Takes a directive apart: arguments, options, content. */
final class RstDirectiveReader {
  private final RstBlocks blocks;
  private final String file;
  private final RstPlace place;
  private final int depth;

  RstDirectiveReader(RstBlocks blocks, RstPlace place, int depth) {
    this.blocks = blocks;
    this.file = blocks.file();
    this.place = place;
    this.depth = depth;
  }

  /**
   * Adds its blocks.
   *
   * @param line its first line
   * @param below the indented lines below
   */
  void read(RstDirective directive, RstLine line, List<RstLine> below) {
    List<RstLine> head = new ArrayList<>();
    if (!directive.arguments().isBlank()) {
      head.add(directive.arguments().in(RstLines.column(below).orElse(0)));
    }
    int content = 0;
    while (content < below.size() && !below.get(content).isBlank()) {
      head.add(below.get(content++));
    }
    int options = 0;
    while (options < head.size() && RstSyntax.field(file, head.get(options)) < 0) {
      options++;
    }
    List<RstLine> arguments = head.subList(0, options);
    List<RstLine> values = head.subList(options, head.size());
    List<RstLine> rest = below.subList(content, below.size());
    if (directive.kind() == RstDirective.Kind.VERBATIM) {
      boolean direct = values.isEmpty();
      List<RstLine> code = direct ? withoutName(directive, arguments, rest) : rest;
      readVerbatim(directive, line, values, code);
    } else {
      blocks.beginAt(line.start());
      readWords(directive, arguments, values, rest);
      blocks.end();
    }
  }

  /** What of the arguments is content, as a formula may begin right behind its directive. */
  private static List<RstLine> withoutName(
      RstDirective directive, List<RstLine> arguments, List<RstLine> rest) {
    int named = Math.min(arguments.size(), directive.arguments().isBlank() ? 0 : 1);
    List<RstLine> content = new ArrayList<>(arguments.subList(named, arguments.size()));
    content.addAll(rest);
    return content;
  }

  private void readVerbatim(
      RstDirective directive, RstLine line, List<RstLine> values, List<RstLine> content) {
    boolean empty = RstLines.column(content).isEmpty();
    if (empty) {
      blocks.addVerbatim(line.span());
    }
    readOptions(directive, values);
    if (!empty) {
      blocks.end();
      blocks.addVerbatim(RstLines.extent(content));
    }
  }

  private void readWords(
      RstDirective directive, List<RstLine> arguments, List<RstLine> values, List<RstLine> rest) {
    switch (directive.kind()) {
      case NOTE -> nest(directive, arguments, values, rest, place);
      case QUOTATION -> nest(directive, arguments, values, rest, place.quotation());
      case VERSIONED -> {
        int column = RstLines.column(rest).orElse(0);
        List<RstLine> words =
            withoutVersions(arguments, directive.versions()).stream()
                .map(line -> line.in(column))
                .toList();
        nest(directive, words, values, rest, place);
      }
      case TITLED -> {
        addParagraph(arguments);
        readOptions(directive, values);
        if (directive.isValues()) {
          RstValues.read(file, rest).forEach(this::addCell);
        } else {
          nest(rest, directive.isList() ? RstPlace.CELL : place);
        }
      }
      case SILENT -> readOptions(directive, values);
      default -> {
        readOptions(directive, values);
        nest(rest, place);
      }
    }
  }

  /** Reads arguments that are words like the content; without options between they are one. */
  private void nest(
      RstDirective directive,
      List<RstLine> arguments,
      List<RstLine> values,
      List<RstLine> rest,
      RstPlace inside) {
    if (values.isEmpty()) {
      List<RstLine> all = new ArrayList<>(arguments);
      all.addAll(rest);
      nest(all, inside);
    } else {
      nest(arguments, inside);
      readOptions(directive, values);
      nest(rest, inside);
    }
  }

  private List<RstLine> withoutVersions(List<RstLine> arguments, int count) {
    if (arguments.isEmpty()) {
      return arguments;
    }
    RstLine first = arguments.get(0);
    RstLine words = first;
    for (int i = 0; i < count; i++) {
      int at = words.start();
      while (at < words.end() && !Characters.isSpace(file.charAt(at))) {
        at++;
      }
      words = words.behind(file, at);
    }
    List<RstLine> rest = new ArrayList<>(arguments);
    rest.set(0, words);
    return rest;
  }

  /** The options that readers see, such as what an image shows. */
  private void readOptions(RstDirective directive, List<RstLine> values) {
    int at = 0;
    while (at < values.size()) {
      RstLine first = values.get(at);
      int colon = RstSyntax.field(file, first);
      List<RstLine> value = new ArrayList<>();
      value.add(colon < 0 ? first : first.behind(file, colon + 1));
      at++;
      while (at < values.size() && RstSyntax.field(file, values.get(at)) < 0) {
        value.add(values.get(at++));
      }
      String name = colon < 0 ? "" : file.substring(first.start() + 1, colon);
      if (directive.shows(name.toLowerCase(Locale.ROOT))) {
        addParagraph(value);
      } else if (directive.isValues() && name.equals("header")) {
        RstValues.read(file, value).forEach(this::addCell);
      }
    }
  }

  private void addCell(List<Span> lines) {
    blocks.add(RstPlace.CELL, lines, lines.get(0).cover(lines.get(lines.size() - 1)));
  }

  private void addParagraph(List<RstLine> lines) {
    List<Span> words = lines.stream().filter(line -> !line.isBlank()).map(RstLine::span).toList();
    if (!words.isEmpty()) {
      blocks.add(place, words, words.get(0).cover(words.get(words.size() - 1)));
    }
  }

  private void nest(List<RstLine> body, RstPlace inside) {
    RstLines.column(body)
        .ifPresent(column -> new RstBody(blocks, body, column, inside, depth).read());
  }
}
