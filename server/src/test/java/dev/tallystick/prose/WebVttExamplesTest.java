package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/**
 * Files built like the examples in the introduction of W3C's WebVTT, in words of our own; the names
 * of its sections are from memory.
 */
class WebVttExamplesTest {
  @Test
  void aSimpleCaptionFile() { // 1.1
    mask(
        """
        WEBVTT
        ······

        00:11.000 --> 00:13.000
        ·······················
        <v Mira Holt>We are on the old quay of Orr
        ·············We are on the old quay of Orr

        00:13.000 --> 00:16.000
        ·······················
        <v Mira Holt>and wait with <i>Odile Brandt</i>
        ·············and wait with ···Odile Brandt····
        """);
  }

  @Test
  void captionCuesWithMultipleLines() { // 1.2
    mask(
        """
        WEBVTT
        ······

        1
        ·
        00:01.000 --> 00:04.000
        ·······················
        Never row out in fog.
        Never row out in fog.

        2
        ·
        00:05.000 --> 00:09.000
        ·······················
        - You will run aground.
        ··You will run aground.
        - You may even sink.
        ··You may even sink.
        """);
  }

  @Test
  void stylingCaptions() { // 1.3
    mask(
        """
        WEBVTT
        ······

        STYLE
        ·····
        ::cue(b) {
        ··········
          color: navy;
        ··············
        }
        ·

        NOTE no style behind the first cue
        ··································

        00:00.000 --> 00:10.000
        ·······················
        - Good day, <b.first.loud>harbour</b>!
        ··Good day, ··············harbour····!
        """);
  }

  @Test
  void otherCaptionAndSubtitlingFeatures() { // 1.4
    mask(
        """
        WEBVTT
        ······

        REGION
        ······
        id:mira
        ·······
        width:40%
        ·········

        00:00.000 --> 00:04.000 position:10%,line-left align:left size:35%
        ··································································
        Where did the <00:01.000>ferry <00:02.000>go?
        Where did the ···········ferry ···········go?

        00:04.000 --> 00:08.000 region:mira align:right
        ···············································
        <lang de>Nach Velm.</lang>
        ·········Nach Velm.·······
        """);
  }

  @Test
  void commentsInWebVtt() { // 1.5
    mask(
        """
        WEBVTT - made by Odile for a film
        ·································

        NOTE
        ····
        She did not translate
        ·····················
        the shanty.
        ···········

        1 - the mole
        ············
        00:01.000 --> 00:02.000
        ·······················
        Cast off!
        Cast off!
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.WEBVTT, table);
  }
}
