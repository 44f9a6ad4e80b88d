package dev.tallystick.aid;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.tallystick.prose.Format;
import org.junit.jupiter.api.Test;

/** What is put into a translation in XML. */
class XmlStubTest {
  @Test
  void aParagraphOfDocBookComesWithItsTags() {
    assertEquals(
        """
        <article>
          <para>Sie legt ab.</para>
          <para>
            The <guilabel>bell</guilabel> rings.
          </para>
          <para>Niemand schwimmt. Stay &amp; <emphasis>wait</emphasis>. Dort ist es.</para>
        </article>
        """,
        Stubbed.in(
            Format.XML,
            """
            <article>
              <para>It leaves.</para>
              <para>
                The <guilabel>bell</guilabel> rings.
              </para>
              <para>Nobody swims. Stay &amp; <emphasis>wait</emphasis>. It is there.</para>
            </article>
            """,
            """
            <article>
              <para>Sie legt ab.</para>
              <para>Niemand schwimmt. Dort ist es.</para>
            </article>
            """,
            "0-0 1- 2-1 3- 4-2"));
  }
}
