package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in subtitles, character by character. WebVTT is the W3C's, from memory. */
class SubtitlesMaskTest {
  @Test
  void subRip() {
    Extraction.assertMask(
        Format.SUBRIP,
        """
        1
        ·
        00:00:01,000 --> 00:00:03,500
        ·····························
        The <i>tide</i> waits
        The ···tide···· waits
        for <font color="#ff0">no one</font>.\s
        for ···················no one·······.·

        2
        ·
        00:00:04,000 --> 00:00:06,000  X1:40 Y1:20
        ··········································
        {\\an8}5 < 6 & 7 > {6} <3 &amp; <i
        ······5 < 6 & 7 > {6} <3 &amp; <i

        3
        ·
        00:00:07,000 --> 00:00:09,000
        ·····························
        - Who goes there?
        ··Who goes there?
        <i>- Me.</i>
        ·····Me.····

        4
        ·
        0:00:10,5 --> 0:00:12,5
        ·······················
        [door creaks]
        [door creaks]
        -5 degrees -- and falling
        -5 degrees -- and falling
        5
        ·
        00:00:13,000 --> 00:00:15,000
        ·····························
        ♪ ♪
        ···
        ♪ Row, <b>row</b> ♪
        ♪ Row, ···row···· ♪
        1938
        1938

        Text behind a blank line
        Text behind a blank line

        6
        ·
        """);
  }

  @Test
  void webVtt() {
    Extraction.assertMask(
        Format.WEBVTT,
        """
        WEBVTT - The ferry
        ··················
        Kind: captions
        ··············

        NOTE What follows
        ·················
        is no prose.
        ············

        STYLE
        ·····
        ::cue(.loud) { color: red; }
        ····························

        REGION
        ······
        id:left width:40%
        ·················

        intro
        ·····
        00:01.000 --> 00:03.000 align:start position:10%
        ················································
        <v.first.loud Mira>It is <c.loud>late</c>, &lt;late&gt;.
        ···················It is ········late····, &lt;late&gt;.
        <00:00:02.000>Very <00:00:02.500><lang nb>sent</lang>.
        ··············Very ·······················sent·······.

        NOTE
        ····

        00:04.000 --> 00:05.000
        ·······················
        NOTE is a word here.
        NOTE is a word here.

        01:00:04.000 --> 01:00:05.000
        ·····························
        <v Mira>“— Yes.”
        ········“— Yes.”
        — No.
        ··No.
        """);
  }
}
