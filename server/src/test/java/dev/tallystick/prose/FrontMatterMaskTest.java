package dev.tallystick.prose;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.text.Text;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What is prose in front matter, character by character. */
class FrontMatterMaskTest {
  @Test
  void yamlOnOneLine() {
    mask(
        """
        ---
        ···
        layout: page # title: no
        ························
        title: The lamp: a history # of sorts
        ·······The lamp: a history···········
        "summary": 'It isn''t "out" # yet' # or
        ············It isn'·t "out" # yet······
        description: "A \\"lamp\\" \\u2013 and oil" # all
        ··············A ·"lamp·" ······ and oil·······
        hero:
        ·····
          subtitle: C# for keepers
        ············C# for keepers
          titles: none
        ··············
        pages:
        ······
          - title: Oil
        ···········Oil
            "title" : "Wick
        ···············Wick
        title: [a, b]
        ·············
        title: {a: b}
        ·············
        title: *lamp
        ············
        title:
        ······
        ---
        ···
        """);
  }

  @Test
  void yamlOnSeveralLines() {
    mask(
        """
        ---
        ···
        description: >- # folded
        ························
          The lamp burns
        ··The lamp burns
          all night.
        ··all night.

          Not by day: title: no.
        ··Not by day: title: no.
        code: |
        ·······
          title: no
        ···········
        summary: |2
        ···········
            Two lines
        ····Two lines
           # of text
        ···# of text
        title: Goes
        ·······Goes
          on # here
        ··on·······
        subtitle: "Goes
        ···········Goes
          on" # here
        ··on········
        ...
        ···
        # Text
        ··Text
        """);
  }

  @Test
  void toml() {
    mask(
        """
        +++
        ···
        title = "The \\"old\\" lamp" # bright
        ·········The ·"old·" lamp··········
        weight = 3
        ··········
        page.summary = 'A \\ lamp'
        ················A \\ lamp·
        [params]
        ········
        "description" = \"""
        ···················
          It burns.
        ··It burns.

          "Out" it is.
        ··"Out" it is.
        \"""
        ···
        code = '''
        ··········
        title = "no"
        ············
        '''
        ···
        subtitle = ["no"]
        ·················
        title = '''It isn't''' # x
        ···········It isn't·······
        +++
        ···
        """);
  }

  @Test
  void onlyTheNamedKeysHaveProse() {
    String file = "---\ntitle: Lamp\ncaption: Oil\n---\n\nText.\n";
    assertEquals(List.of("Lamp", "Text."), prose(file, FrontMatterKeys.USUAL));
    assertEquals(List.of("Oil", "Text."), prose(file, FrontMatterKeys.of(List.of("caption"))));
    assertEquals(List.of("Text."), prose(file, FrontMatterKeys.of(List.of())));
  }

  @Test
  void aBlockForEachValueAndEachParagraph() {
    String file = "---\ntitle: Lamp\nsummary: >\n  Of\n  oil.\n\n  Of wicks.\n---\n= Lamp\n:a: b\n";
    String expected =
        """
        METADATA: Lamp
        METADATA: Of⏎oil.
        METADATA: Of wicks.
        """;
    Extraction.assertBlocks(Format.ASCIIDOC, file, expected + "HEADING 1: Lamp\n");
    Extraction.assertExtents(
        Format.MARKDOWN,
        file.replace("= Lamp\n:a: b\n", ""),
        "title: Lamp\nsummary: >⏎  Of⏎  oil.\nOf wicks.\n");
  }

  private static List<String> prose(String file, FrontMatterKeys keys) {
    return Format.MARKDOWN.blocks(new Text(file), keys).stream().map(b -> b.prose(file)).toList();
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.MARKDOWN, table);
  }
}
