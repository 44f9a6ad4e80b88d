package dev.tallystick.cli;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * A short invented pair to write into a folder: the handbook of a cable car that does not exist.
 */
final class CableCar {
  static final String ENGLISH =
      """
      # The cable car

      The cable car climbs from the market square to the upper station in 9 minutes. It carries 24 \
      people, or 18 people and one very large dog. Before the first ride the driver walks once \
      around the cabin and looks at every window. A cracked pane is reported to the workshop, and \
      the cabin stays in the valley until the pane has been replaced.

      ## Before the first ride

      Switch on the heating in the driver's stand by 6 o'clock at the latest. Listen to the motor \
      for a full minute, because a healthy motor hums and a sick one sings. Check the pressure of \
      the brakes on the dial beside the door: the hand must stand between 5 and 7. Write down the \
      figure, the weather and your name in the green book. If the hand stands below 5, call Odile \
      Brankamp in the workshop and do not move the cabin.

      ## Under way

      Close the doors yourself, and never leave that to a passenger. Greet the passengers and tell \
      them where the 2 emergency exits are. In a strong wind the cabin travels at half speed, and \
      in a gale it does not travel at all. At tower 3 the cabin sways a little, which frightens \
      nobody who has been told beforehand.

      ## In the evening

      Bring the cabin back to the valley before the clock strikes 10. Sweep the floor, empty the \
      bin and look under the benches for forgotten gloves. Turn off the heating and lock the \
      driver's stand. The key hangs in the office behind the picture of the founder, Casimir Thule.
      """;

  static final String GERMAN =
      """
      # Die Seilbahn

      Die Seilbahn fährt vom Marktplatz in 9 Minuten zur Bergstation hinauf. Sie befördert 24 \
      Personen oder 18 Personen und einen sehr großen Hund. Vor der ersten Fahrt geht der Fahrer \
      einmal um die Kabine herum und sieht sich jedes Fenster an. Eine gesprungene Scheibe wird \
      der Werkstatt gemeldet, und die Kabine bleibt im Tal, bis die Scheibe ersetzt worden ist.

      ## Vor der ersten Fahrt

      Schalten Sie spätestens um 6 Uhr die Heizung im Führerstand ein. Horchen Sie eine volle \
      Minute lang auf den Motor, denn ein gesunder Motor summt, und ein kranker singt. Prüfen Sie \
      den Druck der Bremsen an der Anzeige neben der Tür: Der Zeiger muss zwischen 5 und 7 stehen. \
      Schreiben Sie den Wert, das Wetter und Ihren Namen in das grüne Buch. Steht der Zeiger unter \
      5, so rufen Sie Odile Brankamp in der Werkstatt an und bewegen Sie die Kabine nicht.

      ## Unterwegs

      Schließen Sie die Türen selbst, und überlassen Sie das nie einem Fahrgast. Begrüßen Sie die \
      Fahrgäste und sagen Sie ihnen, wo die 2 Notausgänge sind. Bei starkem Wind fährt die Kabine \
      mit halber Kraft, und bei Sturm fährt sie überhaupt nicht. Am Mast 3 schwankt die Kabine ein \
      wenig, was niemanden erschreckt, dem man es vorher gesagt hat.

      ## Am Abend

      Bringen Sie die Kabine ins Tal zurück, bevor die Uhr 10 schlägt. Fegen Sie den Boden, leeren \
      Sie den Eimer und sehen Sie unter den Bänken nach vergessenen Handschuhen. Drehen Sie die \
      Heizung ab und schließen Sie den Führerstand zu. Der Schlüssel hängt im Büro hinter dem Bild \
      des Gründers Casimir Thule.
      """;

  /** A sentence of the source, and its translation. */
  static final String GLOVES =
      "Sweep the floor, empty the bin and look under the benches for forgotten gloves.";

  static final String HANDSCHUHE =
      "Fegen Sie den Boden, leeren Sie den Eimer und sehen Sie unter den Bänken nach vergessenen"
          + " Handschuhen.";

  private CableCar() {}

  /** German with one sentence left in English: a warning. */
  static String untranslated() {
    return replaced(HANDSCHUHE, GLOVES);
  }

  /** German with one long sentence cut short: an information. */
  static String cutShort() {
    return replaced(" an der Anzeige neben der Tür: Der Zeiger muss zwischen 5 und 7 stehen.", ".");
  }

  /** German in which nothing stands for the brakes and the green book. */
  static String withoutBrakes() {
    int from = GERMAN.indexOf("Prüfen Sie den Druck");
    int to = GERMAN.indexOf("Steht der Zeiger");
    return GERMAN.substring(0, from) + GERMAN.substring(to);
  }

  /** What {@link #withoutBrakes()} lacks, in the source. */
  static String brakes() {
    int from = ENGLISH.indexOf("Check the pressure");
    int to = ENGLISH.indexOf(" If the hand stands below");
    return ENGLISH.substring(from, to);
  }

  /** German that stops after the second section. */
  static String firstHalf() {
    return GERMAN.substring(0, GERMAN.indexOf("## Unterwegs"));
  }

  private static String replaced(String old, String replacement) {
    if (!GERMAN.contains(old)) {
      throw new IllegalArgumentException(old);
    }
    return GERMAN.replace(old, replacement);
  }

  /** Writes the source and a translation: {@code guide.md} and {@code guide.de.md}. */
  static void pair(Path folder, String german) {
    write(folder.resolve("guide.md"), ENGLISH.getBytes(StandardCharsets.UTF_8));
    write(folder.resolve("guide.de.md"), german.getBytes(StandardCharsets.UTF_8));
  }

  /** Writes a file, and the folders above it. */
  static Path write(Path file, byte[] bytes) {
    try {
      Files.createDirectories(file.getParent());
      return Files.write(file, bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Writes a file in UTF-8. */
  static Path write(Path file, String text) {
    return write(file, text.getBytes(StandardCharsets.UTF_8));
  }
}
