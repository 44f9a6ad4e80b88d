package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.tallystick.align.Match;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Common practice, no source: from English into Hindi only about two matches in three are one to
 * one, and up to six sentences stand for one. This pair is made that way. (Legal texts are not: in
 * the declaration of human rights nearly nine in ten are one to one, see {@code MatchSharesIT}.)
 */
class EnglishHindiPairsTest {
  private static final String TABLE =
      """
      ¶# The stepwell of Sundarkot
      | # सुंदरकोट की बावड़ी
      ¶ The stepwell of Sundarkot is 28 m deep and has 214 steps.
      | सुंदरकोट की बावड़ी 28 मीटर गहरी है और इसमें 214 सीढ़ियाँ हैं।
      It was dug 300 years ago by the women of the village, who were tired of walking to the river.
      | इसे 300 साल पहले गाँव की महिलाओं ने खोदा था। / वे नदी तक पैदल जाते-जाते थक चुकी थीं।
      ¶ The gate is opened at 6:00 and closed at sunset.
      | फाटक सुबह 6:00 बजे खुलता है और सूर्यास्त पर बंद होता है।
      The keeper, Mr. Rathod, sits beside it and counts the buckets.
      | रखवाले श्री राठौड़ उसके पास बैठते हैं और बाल्टियाँ गिनते हैं।
      Each family may draw 12 buckets a day, but in the dry months, when the water stands below the red line, only 8.
      | हर परिवार दिन में 12 बाल्टियाँ भर सकता है। / सूखे महीनों में पानी लाल निशान से नीचे चला जाता है। / तब केवल 8 बाल्टियाँ मिलती हैं।
      ¶ Nobody washes clothes on the steps.
      | सीढ़ियों पर कोई कपड़े नहीं धोता।
      Soap gets into the water and stays there for weeks.
      | साबुन पानी में मिल जाता है और हफ़्तों तक वहीं रहता है।
      ¶ Whoever wants to clean the lowest landing brings a rope, a lamp, a broom and a friend, tells the keeper, waits until the sun stands over the well, and does not go down alone, because the stones there are covered with moss and a fall is not heard from above.
      | जो सबसे नीचे का चबूतरा साफ़ करना चाहे, वह रस्सी, दीया और झाड़ू साथ लाए। / एक साथी को भी लाए। / पहले रखवाले को बताए। / फिर सूरज के बावड़ी के ऊपर आने तक रुके। / अकेले नीचे न उतरे। / वहाँ पत्थरों पर काई जमी है और गिरने की आवाज़ ऊपर तक नहीं आती।
      ¶ The pump was a gift from the school in 1994.
      | पंप 1994 में विद्यालय ने भेंट किया था।
      It runs for 20 minutes and then has to rest for an hour.
      | वह 20 मिनट चलता है और फिर उसे एक घंटा आराम देना पड़ता है।
      If it smokes, pull the red handle and call Meena Joshi, who has the tools and knows every screw.
      | अगर उसमें से धुआँ निकले, तो लाल हत्था खींचिए और मीना जोशी को बुलाइए। / औज़ार उन्हीं के पास हैं और वे हर पेंच को पहचानती हैं।
      ¶ Pigeons nest in the upper arches.
      | ऊपर की मेहराबों में कबूतर घोंसला बनाते हैं।
      Do not disturb them between March and June.
      | मार्च और जून के बीच उन्हें न छेड़ें।
      ¶ On the night of the first rain 100 lamps are set on the steps, and the oldest woman of the village tells how the well was found.
      | पहली बारिश की रात सीढ़ियों पर 100 दीये रखे जाते हैं। / गाँव की सबसे बूढ़ी महिला सुनाती है कि बावड़ी कैसे मिली थी।
      Strangers are welcome and get a bowl of sweet rice.
      | अजनबियों का स्वागत होता है और उन्हें मीठे चावल का कटोरा मिलता है।
      """;

  @Test
  void aTranslationInManyShortSentencesIsSilent() {
    PairCheck.of("en", "hi").check(TABLE);
  }

  @Test
  void twoMatchesInThreeAreOneToOneAndSixSentencesStandForOne() {
    List<Match> matches = PairCheck.of("en", "hi").result(false, TABLE).alignment().matches();
    long oneToOne = matches.stream().filter(m -> m.sources() == 1 && m.targets() == 1).count();
    double share = (double) oneToOne / matches.size();
    assertTrue(share > 0.55 && share < 0.75, () -> "one to one: " + share);
    assertEquals(6, matches.stream().mapToInt(Match::targets).max().orElse(0));
  }
}
