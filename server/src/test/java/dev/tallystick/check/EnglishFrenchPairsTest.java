package dev.tallystick.check;

import org.junit.jupiter.api.Test;

class EnglishFrenchPairsTest {
  private static final String BEFORE =
      """
      ¶# Borrowing a cargo bicycle
      | # Emprunter un vélo cargo
      ¶ The Quillby society owns 9 cargo bicycles, and every household may borrow one for 2 days.
      | L'association de Quillby possède 9 vélos cargo, et chaque foyer peut en emprunter un 2 jours.
      Mr. Okafor hands out the keys on Saturdays, between 8 and 11 o'clock.
      | M. Okafor remet les clés le samedi, entre 8 et 11 heures.
      He speaks slowly, knows every bolt and does not like to be hurried.
      | Il parle lentement, connaît chaque boulon et n'aime pas être bousculé.
      ¶ Bring your card, a helmet for each child and 20 euros as a deposit.
      | Apportez votre carte, un casque par enfant et 20 euros de caution.
      The deposit is given back when the bicycle is clean and its battery is full.
      | La caution est rendue quand le vélo est propre et sa batterie pleine.
      """;

  private static final String AFTER =
      """
      ¶## If something breaks
      | ## En cas de panne
      ¶ Call 0555-310 and say the number that is painted on the frame.
      | Appelez le 0555-310 et donnez le numéro peint sur le cadre.
      Is the chain off, or is the tyre flat?
      | La chaîne a-t-elle sauté, ou le pneu est-il crevé ?
      Then push the bicycle to the nearest pump; there are 14 of them in town.
      | Poussez alors le vélo jusqu'à la pompe la plus proche ; il y en a 14 en ville.
      Nobody is blamed for wear, but a lost key costs as much as 3 deposits.
      | Personne n'est tenu pour responsable de l'usure, mais une clé perdue coûte 3 cautions.
      """;

  private static void check(String middle) {
    PairCheck.of("en", "fr").check(BEFORE, middle, AFTER);
  }

  @Test
  void aFaithfulTranslationIsSilent() {
    check("");
  }

  @Test
  void aListIsMatchedItemByItem() {
    check(
        """
        ¶ Before you leave the yard, please check:
        | Avant de quitter la cour, vérifiez :
        ¶- both brakes, with the wheels lifted off the ground;
        | - les deux freins, les roues décollées du sol ;
        ¶- the lamp, which must be seen from 50 m;
        | - la lampe, qui doit se voir à 50 m ;
        ¶- the strap that holds the box.
        | - la sangle qui tient la caisse.
        """);
  }

  @Test
  void aMissingItemIsAnOmission() {
    check(
        """
        ¶ Before you leave the yard, please check:
        | Avant de quitter la cour, vérifiez :
        ¶- both brakes, with the wheels lifted off the ground;
        | - les deux freins, les roues décollées du sol ;
        ¶- the lamp, which must be seen from 50 m even when it rains or snows;
        | - !omission
        ¶- the strap that holds the box.
        | - la sangle qui tient la caisse.
        """);
  }

  @Test
  void aMissingHeadingIsAnOmission() {
    check(
        """
        ¶## Loading and unloading
        | - !omission
        ¶ The box carries 80 kg, but the bicycle turns like a ship when it is full.
        | La caisse porte 80 kg, mais pleine, elle fait virer le vélo comme un navire.
        Put heavy things at the bottom, and tie down whatever could fly away.
        | Mettez les choses lourdes au fond, et attachez tout ce qui pourrait s'envoler.
        """);
  }

  @Test
  void aSentenceMissingInAListItemIsAnOmission() {
    check(
        """
        ¶ Before you leave the yard, please check:
        | Avant de quitter la cour, vérifiez :
        ¶- both brakes, with the wheels lifted off the ground;
        | - les deux freins, les roues décollées du sol ;
        ¶- the lamp, which must be seen from 50 m.
        | - la lampe, qui doit se voir à 50 m.
        If it flickers, take the spare one from the tin on the shelf by the door.
        | - !omission
        ¶- the strap that holds the box.
        | - la sangle qui tient la caisse.
        """);
  }

  @Test
  void anAddedParagraphIsOneAddition() {
    check(
        """
        ¶ -
        | Ce service existe depuis 2016 et vit des dons de ses membres. !addition
        -
        | Vous pouvez aussi aider à l'atelier, où il y a toujours du café chaud. !...
        """);
  }

  @Test
  void sentencesMovedIntoOneAreSilent() {
    check(
        """
        ¶ The box carries 80 kg. / When it is full, the bicycle turns like a ship in the harbour.
        | La caisse porte 80 kg, mais une fois pleine, elle fait virer le vélo comme un navire au port.
        """);
  }

  @Test
  void quotationsAndCodeAreMatched() {
    check(
        """
        ¶> A full box has no friends on a hill, as the old members say.
        | > Une caisse pleine n'a pas d'amis dans une côte, disent les anciens.
        ¶```unlock 0555-310```
        | ```unlock 0555-310```
        ¶ Send this line from your telephone, and the lock opens within 10 seconds.
        | Envoyez cette ligne depuis votre téléphone, et le cadenas s'ouvre en 10 secondes.
        """);
  }
}
