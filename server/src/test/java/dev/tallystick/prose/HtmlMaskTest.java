package dev.tallystick.prose;

import org.junit.jupiter.api.Test;

/** What is prose in HTML, character by character. */
class HtmlMaskTest {
  @Test
  void blocksAndInlineTags() {
    mask(
        """
        <!DOCTYPE html>
        ···············
        <title>The old ferry</title>
        ·······The old ferry········
        <h1>The <em>old</em> ferry</h1>
        ····The ····old····· ferry·····
        <p>It is <a href="b.html"><b>a boat</b></a>, H<sub>2</sub>O and
        ···It is ····················a boat········, H·····2······O and
           <kbd>all</kbd>.
        ········all······.
        <p>Never closed
        ···Never closed
        <div>Bare text<hr>and more</div>tail
        ·····Bare text····and more······tail
        """);
  }

  @Test
  void whatIsNoProse() {
    mask(
        """
        <p>Before<!-- a comment --> and after</p>
        ···Before·················· and after····
        <script>if (a < b) { "text"; }</script>
        ·······································
        <style>p { content: "text" }</style><template><p>later</p></template>
        ·····································································
        <svg><title>Drawing</title><text>text</text></svg><math><mi>x</mi></math>
        ·········································································
        """);
    mask(
        """
        <pre class="code">
        ··················
        <b>make</b> ferry
        ·················
        </pre>
        ······
        <textarea>typed</textarea>x<![CDATA[data]]><?php echo 1 ?>
        ··························x·······························
        <noscript><p>No script</p></noscript>
        ·············No script···············
        """);
  }

  @Test
  void whiteSpaceCollapsesAcrossTags() {
    mask(
        """
        <p>  One  <b>  two</b>   three
        ·····One ······two···· ··three
            four  </p>
        ····four······
        """);
  }

  @Test
  void references() {
    mask(
        """
        <p>10&nbsp;km, on the &ldquo;Br&uuml;cke&rdquo; of AT&amp;T &mdash; &Auml;tsch&#228; &#x41F;&#x43e;
        ···10&·····km, on the ·······Br·u····cke&······ of AT&····T &······ ·A····tsch··2··· ·····F···x····
        <p>End.&nbsp; Next&nbsp;
        ···End.······ Next······
        <p>don&rsquo;t, l&#39;eau &lsquo;a.&rsquo; co&shy;op &#8203;&notit; &copy &unknown; R&D &;&#;
        ···don·······t, l·····eau ·······a.······· co·····op ·······&···it; &···· &unknown; R&D &;&#;
        """);
  }

  @Test
  void lineBreaksPartWords() {
    mask(
        """
        <p>Keeper's Row 3<br>Orrowhelm<br/>
        ···Keeper's Row 3<···Orrowhelm·····
        the island<wbr>s<br>
        the island·····s····
        shore<br><br>End</p>
        shore········End····
        """);
  }

  @Test
  void attributes() {
    mask(
        """
        <meta name="description" content="On the island"><meta name="robots" content="none">
        ··································On the island·····································
        <p title="A &quot;tip&quot;">Text</p><a href="x" title=Top aria-label='To the top'></a>
        ··········A ······tip&·······Text······················Top·············To the top······
        <input placeholder="Your name" value="none"><input type=submit value="Send">
        ····················Your name·········································Send··
        """);
    mask(
        """
        <p>The<img src="l.png" alt="lamp room">is lit, <a title="not read">always</a>.
        ···The<·····················lamp room"·is lit, ····················always····.
        <p><a title="Behind"></a>Here <i title="Late"></i></p>
        ·············Behind······Here···········Late··········
        """);
  }

  @Test
  void whatIsNotToBeTranslated() {
    mask(
        """
        <p>The <span translate="no">Orrow 5</span> lamp</p>
        ···The ·····················Orrow 5······· lamp····
        <div translate="no" title="No"><p>Orrow 5</p>
        ·············································
        <p translate="yes">A lamp</p></div>
        ···················A lamp··········
        """);
  }

  @Test
  void brokenMarkup() {
    mask(
        """
        <p class=a>One</b> two</i></div> a < b & c
        ···········One···· two·········· a < b & c
        <p>One</>, two
        ···One···, two
        <table>Lost<tr><td>cell</table>
        ·······Lost········cell········
        <b>x<i>y</b>z</i>
        ···x···y····z····
        <p>end <a href="never
        ···end···············
        """);
  }

  private static void mask(String table) {
    Extraction.assertMask(Format.HTML, table);
  }
}
