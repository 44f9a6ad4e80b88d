package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import org.junit.jupiter.api.Test;

class FormatTest {
  @Test
  void theExtensionTellsTheFormat() {
    assertEquals(Optional.of(Format.PLAIN), Format.ofName("en/ferry.TXT"));
    assertEquals(Optional.of(Format.MARKDOWN), Format.ofName("de.ferry.md"));
    assertEquals(Optional.of(Format.MARKDOWN), Format.ofName("A.MARKDOWN"));
    assertEquals(Optional.of(Format.SUBRIP), Format.ofName("ferry.de.srt"));
    assertEquals(Optional.of(Format.WEBVTT), Format.ofName("ferry.vtt"));
    assertEquals(Optional.of(Format.ASCIIDOC), Format.ofName("ferry.adoc"));
    assertEquals(Optional.of(Format.XML), Format.ofName("ferry.ditamap"));
    assertEquals(Optional.of(Format.HTML), Format.ofName("ferry.xhtml"));
    assertEquals(Optional.of(Format.LATEX), Format.ofName("ferry.ltx"));
    assertEquals(Optional.of(Format.LATEX), Format.ofLanguage("plaintex"));
    assertEquals(Optional.of(Format.RST), Format.ofName("ferry.rst"));
    assertEquals(Optional.empty(), Format.ofName("docs.md/ferry"));
    assertEquals(Optional.empty(), Format.ofName("md"));
    assertEquals(Optional.of(Format.HTML), Format.ofName("en/ferry.htm"));
  }

  @Test
  void everyExtensionIsRecognized() {
    for (Format format : Format.values()) {
      for (String extension : format.extensions()) {
        assertEquals(Optional.of(format), Format.ofName("ferry." + extension));
      }
    }
  }
}
