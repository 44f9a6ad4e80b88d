package dev.tallystick.opendata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonParser;
import dev.tallystick.align.Aligner;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A second opinion on {@link Aligner#PUBLISHED}: the same model as the language toolkit NLTK has
 * it, with the same constants. NLTK takes the tail of the normal distribution as one minus its
 * distribution function, which is 0 from 8.3 deviations on, and where every link into a cell is
 * that improbable, it begins anew at no cost. An omission is that far from 234 characters on; the
 * sequences drawn here are shorter, and one test shows where the two part.
 */
class PublishedModelIT {
  private static final int SEQUENCES = 60;

  /** The longest omission that has a probability in NLTK has 233 characters. */
  private static final int TOO_LONG = 234;

  @TempDir Path folder;

  private final List<Lengths> sequences = new ArrayList<>();

  @BeforeEach
  void draw() {
    for (int seed = 0; seed < SEQUENCES; seed++) {
      sequences.add(Lengths.drawn(seed));
    }
  }

  @Test
  void sixtyPairsOfLengthsAreAlignedAsBySomebodyElse() throws Exception {
    Nltk theirs = Nltk.on(sequences, folder);
    List<String> differing = new ArrayList<>();
    for (int i = 0; i < SEQUENCES; i++) {
      String ours = Nltk.ours(sequences.get(i));
      if (!ours.equals(theirs.links().get(i))) {
        differing.add(
            i + ": " + sequences.get(i) + "\n ours " + ours + "\n NLTK " + theirs.links().get(i));
      }
    }
    System.out.printf(
        "NLTK: %d of %d alignments are ours%n", SEQUENCES - differing.size(), SEQUENCES);
    assertEquals("", String.join("\n", differing));
    assertEquals(theirs.links(), theirs.exact());
  }

  /** What makes the comparison one of the programs and not of their constants. */
  @Test
  void theConstantsAreTheSame() throws Exception {
    String expected =
        """
        {"average":1,"variance":6.8,"priors":{"1-0":0.0099,"0-1":0.0099,"1-1":0.89,\
        "2-1":0.089,"1-2":0.089,"2-2":0.011}}""";
    assertEquals(JsonParser.parseString(expected), Nltk.on(List.of(), folder).constants());
  }

  /** So that equal answers mean something: the sequences hold what aligners err on. */
  @Test
  void theSequencesHoldMergesSplitsAndDrops() {
    int[] changes = new int[Lengths.CHANGES];
    for (Lengths lengths : sequences) {
      assertTrue(lengths.source().length >= 10 && lengths.target().length >= 10);
      assertTrue(lengths.source().length <= 40 && lengths.target().length <= 40);
      assertTrue(lengths.longest() < TOO_LONG, () -> lengths.toString());
      for (int i = 0; i < changes.length; i++) {
        changes[i] += lengths.changes()[i];
      }
    }
    for (int count : changes) {
      assertTrue(count >= SEQUENCES, "only " + count + " of a kind of change");
    }
  }

  /**
   * Where the tail has no digits left in NLTK, it gives up the sentences before; we do not, and nor
   * does NLTK with a tail that keeps them. By hand: 10 for 12 and 340 for 40 are 0.2 and 8.3
   * deviations off, 310 for 12 would be 9.0, and 300 for nothing 9.4.
   */
  @Test
  void aLongSentenceAtTheStartPartsTheTwo() throws Exception {
    Lengths lengths = new Lengths(new int[] {10, 300, 40}, new int[] {12, 40});
    Nltk theirs = Nltk.on(List.of(lengths), folder);
    assertEquals(List.of("[[2,0],[2,1]]"), theirs.links());
    assertEquals(List.of("[[0,0],[1,1],[2,1]]"), theirs.exact());
    assertEquals("[[0,0],[1,1],[2,1]]", Nltk.ours(lengths));
  }
}
