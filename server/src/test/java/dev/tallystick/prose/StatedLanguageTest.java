package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** The language that a document gives for itself. */
class StatedLanguageTest {
  @Test
  void theRootOfXmlTells() {
    says("de", Format.XML, "<?xml version='1.0'?><!-- <a xml:lang='fr'> --><log xml:lang='de'/>");
    says("en-us", Format.XML, "<!DOCTYPE book [<!ENTITY a '<b lang=\"fr\">'>]><book lang='en-us'>");
    says("sr-Latn", Format.XML, "\uFEFF\n<log lang='sr' xml:lang='sr-Latn'><p xml:lang='de'/>");
    says("", Format.XML, "<log><p xml:lang='de'/></log>");
    says("", Format.XML, "<log xml:lang=' '/>");
    says("", Format.XML, "<log xml:lang='de'".repeat(3));
    says("", Format.XML, "");
  }

  @Test
  void thePageTells() {
    says(
        "de-AT", Format.HTML, "<!doctype html>\n<!-- x --><html class=a lang=de-AT><body lang=fr>");
    says("", Format.HTML, "<p lang=de>Text");
  }

  @Test
  void frontMatterTells() {
    says("de", Format.MARKDOWN, "---\ntitle: A\nlang: de\n---\nlang: fr\n");
    says("zh_TW", Format.MARKDOWN, "---\r\nlanguage: \"zh_TW\" # as written\r\n---\r\n");
    says("pt-BR", Format.MARKDOWN, "+++\nlang = 'pt-BR'\n+++\n");
    says("", Format.MARKDOWN, "+++\ntitle = 'A'\n[menu]\nlang = 'de'\n+++\n");
    says("", Format.MARKDOWN, "---\ntitle: A\nmenu:\n  lang: de\n---\n");
    says("", Format.MARKDOWN, "---\nlanguages: de\nlang: [de, fr]\n---\n");
    says("", Format.MARKDOWN, "lang: de\n\nText\n");
    says("nl", Format.PLAIN, "\uFEFF---\nlang: nl\n---\nTekst\n");
    says("fr", Format.ASCIIDOC, "---\nlang: fr\n---\n:lang: de\n");
  }

  @Test
  void theHeaderOfAsciiDocTells() {
    says("de", Format.ASCIIDOC, "// note\n\n= Lamp\nMira\n:lang: de\n\nText\n");
    says("", Format.ASCIIDOC, "= Lamp\n\n:lang: de\n");
    says("", Format.ASCIIDOC, "= Lamp\n:lang!:\n");
  }

  @Test
  void subtitlesTellNothing() {
    says("", Format.WEBVTT, "WEBVTT\nlang: de\n");
  }

  private static void says(String tag, Format format, String source) {
    assertEquals(
        Optional.of(tag).filter(some -> !some.isEmpty()),
        format.language(new Text(source)),
        source);
  }
}
