package dev.tallystick.check;

import org.junit.jupiter.api.Test;

/** Sensible cases that come out wrong today: the rows show what comes, the comment what should. */
class ShortfallPairsTest {
  @Test
  void aLongHoleBeginsTwoSentencesTooEarly() {
    PairCheck.of("en", "de")
        .draft(
            """
            # today: the two sentences before the hole are taken for the first and the last of it; they
            # should keep their counterparts, and the nine of the hole be pending
            ¶ # Fire drill in the paper store
            | # Brandübung im Papierlager
            ¶ The alarm in hall 3 is tested on the first Monday of the month, at 10.15 sharp.
            | Der Alarm in Halle 3 wird am ersten Montag des Monats geprüft, pünktlich um 10.15 Uhr.
            Ms Tollander rings the porter beforehand, so that nobody calls the brigade.
            | Frau Tollander ruft vorher beim Pförtner an, damit niemand die Feuerwehr alarmiert.
            Everyone leaves by the east door and waits at the pump until the list has been read.
            | Alle gehen durch die Osttür und warten an der Pumpe, bis die Liste verlesen ist.
            ¶ ## What to carry
            | ## Was mitzunehmen ist
            ¶ Take your coat and nothing else; the ledgers stay where they are, in cabinet 12.
            | - ~
            The cat of the bindery has her own basket, which hangs beside the clock.
            | - ~
            ¶ Do not run on the stairs, and do not go back for the 2 canaries of the accountant.
            | Nehmen Sie den Mantel und sonst nichts; die Bücher bleiben, wo sie sind, in Schrank 12. ~
            ¶ They are fireproof, he says, but we have never had the heart to find out.
            | - ~
            ¶ The lift stops at floor 2 as soon as the bell rings, and its doors stay open.
            | - ~
            Whoever is inside walks down by the iron steps on the yard side of the building.
            | - ~
            ¶ The hoses are older than the house, but they are dried and rolled every week.
            | - ~
            Only the people with a blue badge may open the hydrants, and only in pairs.
            | - ~
            ¶ Buckets of sand stand under each window, and they are not meant for cigarettes.
            | - ~
            If one of them is empty, tell the caretaker, who keeps 9 sacks in the cellar.
            | - ~
            ¶ Last spring the rain came through the roof and did more harm than any fire.
            | Die Katze der Buchbinderei hat einen eigenen Korb, der neben der Uhr hängt. ~
            ¶ ## Afterwards
            | ## Danach
            ¶ When the porter has counted 46 heads, he blows the whistle twice.
            | Hat der Pförtner 46 Köpfe gezählt, pfeift er zweimal.
            ¶ Write down how long it took, and hang the sheet on the board in the canteen.
            | Schreiben Sie auf, wie lange es gedauert hat, und hängen Sie das Blatt in die Kantine.
            The best time so far is 3 minutes and 20 seconds, set by the night shift in 2011.
            | Die Bestzeit liegt bei 3 Minuten und 20 Sekunden, aufgestellt 2011 von der Nachtschicht.
            ¶ ## Questions
            | ## Fragen
            ¶ May I finish my telephone call with Copenhagen first?
            | ¶ Darf ich mein Telefonat mit Kopenhagen noch zu Ende führen?
            No, and Ms Tollander will note down your name in the red book.
            | Nein, und Frau Tollander wird Ihren Namen im roten Buch vermerken.
            ¶ What happens if the drill falls on a holiday, such as 1 May?
            | Was geschieht, wenn die Übung auf einen Feiertag fällt, etwa auf den 1. Mai?
            Then it is held on the Tuesday, and the siren is tested without the band.
            | Dann findet sie am Dienstag statt, und die Sirene wird ohne die Kapelle geprüft.
            """);
  }

  @Test
  void aMovedSentenceShiftsThoseThatItPassed() {
    PairCheck.of("en", "fr")
        .check(
            """
            # today: should be !order on the sentence of Bettina Krull, the others 1-1 as they stand
            ¶ # Borrowing a cargo bicycle
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
            ¶ The box carries 80 kg, but the bicycle turns like a ship when it is full.
            | La caisse porte 80 kg, mais pleine, elle fait virer le vélo comme un navire.
            Bettina Krull of 17 Dock Street sells straps and bells of every size and colour.
            | Mettez les choses lourdes au fond, et attachez tout ce qui pourrait s'envoler.
            ¶ Put heavy things at the bottom, and tie down whatever could fly away.
            | Garez-vous la caisse contre le mur, et emportez la clé.
            ¶ Park with the box towards the wall, and take the key with you.
            | Bettina Krull, 17 Dock Street, vend des sangles et des sonnettes de toutes tailles.
            ¶ ## If something breaks
            | ## En cas de panne
            ¶ Call 0555-310 and say the number that is painted on the frame.
            | Appelez le 0555-310 et donnez le numéro peint sur le cadre.
            Is the chain off, or is the tyre flat?
            | La chaîne a-t-elle sauté, ou le pneu est-il crevé ?
            Then push the bicycle to the nearest pump; there are 14 of them in town.
            | Poussez alors le vélo jusqu'à la pompe la plus proche ; il y en a 14 en ville.
            Nobody is blamed for wear, but a lost key costs as much as 3 deposits.
            | Personne n'est tenu pour responsable de l'usure, mais une clé perdue coûte 3 cautions.
            """);
  }
}
