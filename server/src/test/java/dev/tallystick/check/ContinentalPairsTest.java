package dev.tallystick.check;

import org.junit.jupiter.api.Test;

/** Pairs whose source is not English. */
class ContinentalPairsTest {
  private static final String GERMAN_BEFORE =
      """
      ¶# Hausordnung der Sternwarte Hohenried
      | # House rules of the Hohenried observatory
      ¶ Die Kuppel öffnet an klaren Abenden um 21 Uhr und schließt spätestens um 1 Uhr.
      | The dome opens at 9 p.m. on clear evenings and closes at 1 a.m. at the latest.
      Frau Lindqvist entscheidet, ob der Himmel klar genug ist; wer fragt, verzögert es.
      | Mrs. Lindqvist decides whether the sky is clear enough; asking only delays her.
      ¶ Taschenlampen sind verboten, rote Lampen liegen in Fach 4 bereit.
      | Torches are forbidden; red lamps are provided in locker 4.
      Das große Fernrohr wiegt 380 kg und lässt sich trotzdem mit einem Finger bewegen.
      | The large telescope weighs 380 kg and can still be moved with one finger.
      """;

  private static final String GERMAN_AFTER =
      """
      ¶ In der Bibliothek stehen 2200 Bände, darunter ein Atlas mit Kaffeeflecken von 1911.
      | The library holds 2200 volumes, among them an atlas with coffee stains from 1911.
      Ausgeliehen wird nichts, aber abschreiben darf man alles.
      | Nothing may be borrowed, but you may copy out anything you like.
      ¶ Haben Sie einen Kometen entdeckt?
      | Have you discovered a comet?
      Dann läuten Sie die Glocke 3-mal und bewahren Sie Ruhe.
      | Then ring the bell 3 times and keep calm.
      """;

  private static final String FRENCH_BEFORE =
      """
      ¶# Le four communal de Belvaire
      | # Der Gemeindeofen von Belvaire
      ¶ Le four est allumé le vendredi à 5 heures avec 30 kg de bois de hêtre.
      | Der Ofen wird freitags um 5 Uhr mit 30 kg Buchenholz angeheizt.
      M. Perrin surveille le feu et connaît la température rien qu'à l'odeur.
      | Herr Perrin bewacht das Feuer und erkennt die Temperatur allein am Geruch.
      ¶ Chaque famille apporte sa pâte, marquée d'un signe, avant 9 heures.
      | Jede Familie bringt ihren Teig, mit einem Zeichen versehen, vor 9 Uhr.
      Les pains de plus de 2 kg vont au fond, les petits près de la porte.
      | Brote von mehr als 2 kg kommen nach hinten, die kleinen an die Tür.
      """;

  private static final String FRENCH_AFTER =
      """
      ¶ À midi, le four est encore assez chaud pour les tartes et les poires.
      | Mittags ist der Ofen noch heiß genug für Kuchen und Birnen.
      Les enfants reçoivent le premier morceau, et le chien de la boulangère le dernier.
      | Die Kinder bekommen das erste Stück, und der Hund der Bäckerin das letzte.
      ¶ Qui balaie la cendre ?
      | Wer fegt die Asche weg?
      Une liste de 16 noms est accrochée à la porte, et elle est respectée.
      | An der Tür hängt eine Liste mit 16 Namen, und sie wird befolgt.
      """;

  private static void german(String middle) {
    PairCheck.of("de", "en").check(GERMAN_BEFORE, middle, GERMAN_AFTER);
  }

  private static void french(String middle) {
    PairCheck.of("fr", "de").check(FRENCH_BEFORE, middle, FRENCH_AFTER);
  }

  @Test
  void aFaithfulTranslationFromGermanIsSilent() {
    german("");
  }

  @Test
  void aMissingSentenceIsFoundFromGerman() {
    german(
        """
        ¶ Das Okular wird nach jedem Besucher mit dem weichen Pinsel gereinigt.
        | The eyepiece is cleaned with the soft brush after each visitor.
        Niemals darf man darauf hauchen, denn der Atem hinterlässt Ringe, die erst nach Stunden trocknen.
        | - !omission
        Kinder stehen auf der Kiste aus Eschenholz, nicht auf dem Stuhl.
        | Children stand on the box of ash wood, not on the chair.
        """);
  }

  @Test
  void aSplitSentenceFromGermanIsSilent() {
    german(
        """
        ¶ Das Okular wird nach jedem Besucher gereinigt, und zwar mit dem weichen Pinsel aus Fach 7.
        | The eyepiece is cleaned after each visitor. / For this, take the soft brush from locker 7.
        Kinder stehen auf der Kiste aus Eschenholz, nicht auf dem Stuhl.
        | Children stand on the box of ash wood, not on the chair.
        """);
  }

  @Test
  void aFaithfulTranslationFromFrenchIsSilent() {
    french("");
  }

  @Test
  void aMissingSentenceIsFoundFromFrench() {
    french(
        """
        ¶ La pelle de 3 m ne quitte jamais le mur sans la permission de M. Perrin.
        | Die 3 m lange Schaufel verlässt die Wand nie ohne Erlaubnis von Herrn Perrin.
        Celui qui laisse tomber un pain dans la braise offre à boire à toute la file d'attente.
        | - !omission
        Le sel est fourni par la mairie, la levure par personne.
        | Das Salz stellt die Gemeinde, die Hefe niemand.
        """);
  }

  @Test
  void anUntranslatedIslandIsFoundFromFrench() {
    french(
        """
        ¶ La pelle de 3 m ne quitte jamais le mur sans la permission de M. Perrin.
        | La pelle de 3 m ne quitte jamais le mur sans la permission de M. Perrin. !untranslated
        Le sel est fourni par la mairie, la levure par personne.
        | Das Salz stellt die Gemeinde, die Hefe niemand.
        """);
  }
}
