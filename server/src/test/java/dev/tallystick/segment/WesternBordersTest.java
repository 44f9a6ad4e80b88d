package dev.tallystick.segment;

import org.junit.jupiter.api.Test;

/** Borders in the Latin script. Our own sentences; the abbreviations are values from memory. */
class WesternBordersTest {
  @Test
  void english() {
    BorderTable.of("en")
        .check(
            """
            Ask Dr. Alder about the gate. / She has the key.
            They played Dr. Who again. / Nobody minded.
            See Fig. 3 and No. 4 on the wall. / Then go on.
            Is it shut? No. / Then shut it.
            Read Vol. IV first. / It is short.
            Bring tools, e.g. Hammers, and rope. / That is all.
            Bring rope, hooks, etc. / We shall need them.
            Bring rope, hooks, etc. before noon. / We shall need them.
            J. R. Nolan wrote it with A. Voss. / Both are dead.
            The pump was built by J.-P. Arnaud in the spring. / It leaks.
            It is written in plain C. / Then came others.
            Press Alt-C. / Esc does the same.
            The list is sorted by -L. / Keys come first.
            It was shut by the U.S. Coast Guard. / Nobody knew.
            They sailed to the U.S. / The trip took a week.
            The gate opens at 9 p.m. / Then the boats leave.
            The key is with Falcot Inc. / Nobody else has one.
            He lives on Main St. / The house is blue.
            Version 2.4.1 is out. / Version 3 follows.
            Water stood 3.5 m high. / Then it fell.
            This holds for v2.X as well. / It is old.
            Look at https://tide.example/?q=Open&x=1 today. / Bring boots.
            Edit main.cf. / Files named .htaccess stay.
            The rules stand in tide.conf. / Read them.
            "Stop!" and left the room. / Nobody spoke.
            The boat is here.🛶 / Come on board!👍🏽 / Bring 🧤.
            The boat is here. / 🛶 Come on board.
            "Stop!" he cried. / "Why?" asked the porter.
            "It is late." / "Then go."
            He said "Wait there." / Then he left.
            The mill (see the map.) is old. / It still turns.
            It is old (1874!) and dry. / It still turns.
            It is old. / (It still turns.) / The wheel is new.
            Well… / That was all.
            Well… that was all. / Nobody spoke.
            Ropes, hooks, boards, ... / Store them dry.
            The gate is old.[1] / The wall is older.
            The gate is old.† / The wall is older.
            You should see two files. / "5 knots" is the first. / "7 knots" is the other.
            Who may open it? / 2.4. Who may shut it?
            The list is sorted. / 9.5.1. Time
            Is it open?! / Yes, it is.
            A paragraph without a stop ends anyway
            # today: a number behind a stop could open a sentence; UAX #29 goes by the small letter
            The pumps are old. 5 pumps are new.
            # today: an initial at the end before a word that opens no sentence is taken for a name
            Follow plan B. Prepare the boats.
            """);
  }

  @Test
  void german() {
    BorderTable.of("de")
        .check(
            """
            Fragen Sie Prof. Weiss nach dem Tor. / Er hat den Schlüssel.
            Das Tor ist ca. Zwei Meter hoch. / Es klemmt.
            Das Fest ist am 3. Mai 2020. / Danach ist Ruhe.
            Das Fest ist am Montag, dem 3. Juni. / Danach ist Ruhe.
            Es war im 19. Jahrhundert. / Niemand weiß mehr.
            Im XIX. Jahrhundert stand hier nichts. / Danach kam die Mühle.
            Es kamen nur 12. / Die anderen blieben fort.
            Gehen Sie bis Stufe 5. / Standardmäßig ist dort Schluss.
            Lesen Sie Band 3. / Niemand kennt ihn.
            Er starb 1984. / Niemand kam.
            Siehe Abb. 4 und Nr. 5. / Danach geht es weiter.
            Haken, Seile usw. Ende Mai ist alles da. / Gut so.
            Haken, Seile usw. / Das Boot liegt bereit.
            Haken, Seile usw. / Nehmen Sie alles mit.
            Nehmen Sie z. B. Wasser und Brot mit. / Mehr braucht es nicht.
            Nehmen Sie z.B. Wasser und Brot mit. / Mehr braucht es nicht.
            Das war 300 v. Chr. Geburt. / So steht es da.
            „Halt!“, rief sie. / Er blieb stehen.
            „Halt!“ rief sie. / Er blieb stehen.
            »Halt!« rief sie. / »Wer da?« / Er blieb stehen.
            Sie nahm Haken, Seile … / Danach ging sie.
            Es war. / Nun ist es nicht mehr.
            Das Tor steht im Port. / Ältere Tore sind fort.
            Drücken Sie Strg-R. / Es geschieht nichts.
            """);
  }

  @Test
  void romanceLanguages() {
    BorderTable.of("fr")
        .check(
            """
            Voir p. 3 et fig. 4. / Puis continuez.
            M. Martin et Mme Petit sont là. / Ils attendent.
            M. Le Goff garde la clé. / Il habite ici.
            Un programme écrit en C. / Le reste suit.
            « Où ? » demanda-t-elle. / « Par ici. » / Puis elle sortit.
            Prenez des cordes, des crochets, etc. / Il en faut.
            Les touches, les ports… / Vous pouvez tout lire.
            C'était en 300 av. J.-C. à peu près. / On l'ignore.
            Il vit à la mer. / Elle aussi.
            Lisez la valeur « 5 nœuds ». / « 0 » s'affiche à droite.
            """);
    BorderTable.of("es")
        .check(
            """
            El Sr. Silva y la Dra. Ruiz vienen. / Traen la llave.
            ¿Dónde está? / ¡Venga pronto!
            Véase la pág. 3 y el núm. 4. / Luego siga.
            Cuerdas, ganchos, etc. / Todo está seco.
            Pertenece a Falcot Corp. / Por eso está cerrado.
            «¡Alto!» gritó. / Nadie respondió.
            """);
    BorderTable.of("it")
        .check(
            """
            Il sig. Rossi e la Dott.ssa Bianchi vengono. / Portano la chiave.
            Vedi pag. 3 e fig. 4. / Poi continua.
            Corde, ganci, ecc. / Tutto è asciutto.
            """);
    BorderTable.of("pt")
        .check(
            """
            O Sr. Silva e a Dra. Reis vêm. / Trazem a chave.
            Ver p. 3 e fig. 4. / Depois continue.
            Vieram dez. / Todos ficaram.
            """);
    BorderTable.of("ca")
        .check(
            """
            El Sr. Puig i la Dra. Vila vénen. / Porten la clau.
            Vegeu la pàg. 3 i la fig. 4. / Després seguiu.
            Cordes, ganxos, etc. / Tot és sec.
            """);
    BorderTable.of("ro")
        .check(
            """
            Dl. Popescu și dna. Ionescu vin. / Ei au cheia.
            Vezi fig. 3 și nr. 4. / Apoi mergi mai departe.
            Funii, cârlige etc. / Toate sunt uscate.
            """);
  }

  @Test
  void northernLanguages() {
    BorderTable.of("nl")
        .check(
            """
            Vraag dhr. Jansen of mevr. De Wit. / Zij hebben de sleutel.
            Zie fig. 3 en blz. 4. / Ga dan verder.
            Neem bijv. Water en brood mee. / Meer is niet nodig.
            Touwen, haken enz. / Alles is droog.
            """);
    BorderTable.of("sv")
        .check(
            """
            Fråga dr. Lind om porten. / Hon har nyckeln.
            Se fig. 3 och s. 4. / Fortsätt sedan.
            Ta med t.ex. Vatten och bröd. / Mer behövs inte.
            Rep, krokar osv. / Allt är torrt.
            ”Stanna!” ropade hon. / Han stod still.
            """);
    BorderTable.of("da")
        .check(
            """
            Spørg hr. Holm om porten. / Han har nøglen.
            Se fig. 3 og s. 4. / Gå så videre.
            Festen er den 3. maj 2020. / Så er der ro.
            Tag f.eks. Vand og brød med. / Det er nok.
            Reb, kroge osv. / Alt er tørt.
            """);
    BorderTable.of("nb")
        .check(
            """
            Spør hr. Holm om porten. / Han har nøkkelen.
            Se fig. 3 og s. 4. / Gå så videre.
            Ta med f.eks. Vann og brød. / Det er nok.
            Tau, kroker osv. / Alt er tørt.
            """);
    BorderTable.of("nn").check("Spør dr. Holm om porten. / Han har nøkkelen.");
    BorderTable.of("fi")
        .check(
            """
            Kysy toht. Virtaselta portista. / Hänellä on avain.
            Katso s. 3 ja kuva 4. / Jatka sitten.
            Ota mukaan esim. Vettä ja leipää. / Muuta ei tarvita.
            Juhla on 3. toukokuuta. / Sitten on hiljaista.
            Köydet, koukut jne. / Kaikki on kuivaa.
            """);
  }

  @Test
  void easternLanguages() {
    BorderTable.of("pl")
        .check(
            """
            Zapytaj dr. Nowaka i prof. Lis o bramę. / Oni mają klucz.
            Zobacz rys. 3 i str. 4. / Potem idź dalej.
            Weź np. Wodę i chleb. / Więcej nie trzeba.
            Liny, haki itd. / Wszystko jest suche.
            """);
    BorderTable.of("cs")
        .check(
            """
            Zeptejte se Ing. Nováka a MUDr. Malé. / Mají klíč.
            Viz obr. 3 a str. 4. / Potom pokračujte.
            Slavnost je 3. května. / Pak je klid.
            Lana, háky atd. / Vše je suché.
            „Stůj!“ zvolala. / Zastavil se.
            """);
    BorderTable.of("sk")
        .check(
            """
            Opýtajte sa Ing. Nováka a MUDr. Malej. / Majú kľúč.
            Pozri obr. 3 a str. 4. / Potom pokračujte.
            Laná, háky atď. / Všetko je suché.
            """);
    BorderTable.of("hu")
        .check(
            """
            Kérdezze dr. Kovácsot a kapuról. / Nála van a kulcs.
            Vigyen pl. Vizet és kenyeret. / Más nem kell.
            Itt járt II. Rákóczi Ferenc. / Sokan látták.
            Kötelek, kampók stb. / Minden száraz.
            """);
    BorderTable.of("tr")
        .check(
            """
            Kapıyı Dr. Yılmaz biliyor. / Anahtar onda.
            Bkz. Şekil ve s. 4 için notlar. / Sonra devam edin.
            Burada III. Selim yaşadı. / Çok kişi gördü.
            İpler, kancalar vb. / Bunlar kurudur.
            """);
  }
}
