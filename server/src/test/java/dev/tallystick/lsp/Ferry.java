package dev.tallystick.lsp;

/** An invented text in three languages, a sentence a line; the translations lack nothing. */
public final class Ferry {
  public static final String EN =
      """
      # The chain ferry

      The chain ferry at Quillhaven crosses the Murrow every 15 minutes, from dawn to dusk.
      Two keepers work on board.
      The winch pulls the boat along a chain of 410 links that lies on the bed of the river, and it groans on every crossing.
      Before the first crossing the keeper at the winch greases the drum.
      The keeper at the gate sweeps the deck and checks that both lifebelts hang in their places.

      Passengers pay with a brass token, which the harbour office sells in bundles of 12.
      Carts cross for 2 tokens.
      In thick fog the bell is rung once a minute, and the keeper at the gate calls out into the dark until the boat touches the far landing.
      If the chain jams, stop the winch.
      Report every jam to Odile Marchbanks in the harbour office before you set out again.

      At the end of the day the boat is moored on the eastern bank, below the old tannery, with the gate towards the water.
      The last keeper locks the gate.
      In winter the ferry rests whenever ice thicker than a thumb covers the slower half of the river.
      A lantern on the mooring post tells the people on the other bank that no boat will come.
      """;

  public static final String DE =
      """
      # Die Kettenfähre

      Die Kettenfähre in Quillhaven überquert den Murrow alle 15 Minuten, von früh bis spät.
      An Bord arbeiten zwei Wärter.
      Die Winde zieht das Boot an einer Kette mit 410 Gliedern entlang, die auf dem Grund des Flusses liegt, und ächzt bei jeder Fahrt.
      Vor der ersten Überfahrt fettet der Wärter an der Winde die Trommel.
      Der Wärter am Tor fegt das Deck und prüft, ob beide Rettungsringe an ihrem Platz hängen.

      Die Fahrgäste zahlen mit einer Messingmarke, die das Hafenamt in Bündeln zu 12 Stück verkauft.
      Karren kosten 2 Marken.
      Bei dichtem Nebel wird einmal in der Minute geläutet, und der Wärter am Tor ruft ins Dunkel hinaus, bis das Boot am anderen Ufer anlegt.
      Klemmt die Kette, so halten Sie die Winde an.
      Melden Sie jedes Klemmen im Hafenamt bei Odile Marchbanks, bevor Sie wieder ablegen.

      Am Ende des Tages wird das Boot am östlichen Ufer festgemacht, unterhalb der alten Gerberei, das Tor zum Wasser hin.
      Der letzte Wärter schließt das Tor ab.
      Im Winter ruht die Fähre, sobald daumendickes Eis die langsamere Hälfte des Flusses bedeckt.
      Eine Laterne am Pfosten sagt den Leuten am anderen Ufer, dass kein Boot mehr kommt.
      """;

  public static final String FR =
      """
      # Le bac à chaîne

      Le bac à chaîne de Quillhaven traverse le Murrow toutes les 15 minutes, de l'aube au soir.
      Deux gardiens travaillent à bord.
      Le treuil tire le bateau le long d'une chaîne de 410 maillons qui repose au fond de la rivière, et il gémit à chaque passage.
      Avant la première traversée, le gardien du treuil graisse le tambour.
      Le gardien de la barrière balaie le pont et vérifie que les deux bouées sont bien à leur place.

      Les passagers paient avec un jeton de laiton, que le bureau du port vend par paquets de 12.
      Les charrettes coûtent 2 jetons.
      Par brouillard épais, on sonne la cloche une fois par minute, et le gardien de la barrière appelle dans le noir jusqu'à ce que le bateau accoste.
      Si la chaîne se bloque, arrêtez le treuil.
      Signalez chaque blocage à Odile Marchbanks, au bureau du port, avant de repartir.

      À la fin de la journée, on amarre le bateau sur la rive est, au-dessous de l'ancienne tannerie, la barrière tournée vers l'eau.
      Le dernier gardien ferme la barrière.
      En hiver, le bac se repose dès que la glace, épaisse comme le pouce, couvre la moitié de la rivière.
      Une lanterne au poteau dit aux gens de l'autre rive qu'aucun bateau ne viendra plus.
      """;

  /** The sentence of {@link #EN} that tests leave untranslated. */
  static final String FOG_EN = line(EN, "In thick fog");

  static final String FOG_DE = line(DE, "Bei dichtem Nebel");
  static final String FOG_FR = line(FR, "Par brouillard");

  /** Translations that lack it. */
  static final String DE_WITHOUT_FOG = DE.replace(FOG_DE + "\n", "");

  static final String FR_WITHOUT_FOG = FR.replace(FOG_FR + "\n", "");

  private Ferry() {}

  /** The line of a text that starts with some words. */
  static String line(String text, String start) {
    return text.lines().filter(line -> line.startsWith(start)).findFirst().orElseThrow();
  }
}
