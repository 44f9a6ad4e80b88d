package dev.tallystick.check;

import org.junit.jupiter.api.Test;

/** Scripts without blanks, and one from right to left. */
class AsianAndHebrewPairsTest {
  private static final String JAPANESE_BEFORE =
      """
      ¶# The ropeway of Hinode
      | # 日ノ出ロープウェイ
      ¶ The ropeway climbs 620 m in 11 minutes, and every cabin holds 12 people.
      | ロープウェイは11分で620メートルを登り、各ゴンドラの定員は12名です。
      It runs from 8:30 to 17:00, except on days with strong wind or thunder.
      | 強風や雷の日を除き、8:30から17:00まで運行します。
      ¶ Keep the door shut until the bell has rung and the lamp is green.
      | ベルが鳴ってランプが緑になるまで、扉を閉めておいてください。
      Dogs are welcome if they fit on your lap and do not bark at the goats.
      | 犬は、膝に乗る大きさで、ヤギに吠えなければ乗車できます。
      """;

  private static final String JAPANESE_AFTER =
      """
      ¶ At the top there is a hut with 24 beds, a stove and a long shelf of old novels.
      | 頂上には、ベッド24台とストーブ、そして古い小説の並ぶ長い棚のある小屋があります。
      The keeper, Mr. Ishida, cooks a soup of mushrooms at 18:00.
      | 管理人の石田さんが18:00にきのこのスープを作ります。
      ¶ Do you want to walk down?
      | 歩いて下りたいですか？
      Then take the path with the 3 white stones, which is 4 km long and safe in any weather.
      | それなら、白い石が3つある道を行ってください。長さは4キロで、どんな天気でも安全です。
      """
          .replace("ください。長さ", "ください。 / 長さ");

  private static final String CHINESE_BEFORE =
      """
      ¶# Care of the paper lanterns
      | # 纸灯笼的保养
      ¶ The 60 lanterns of Lower Wenshan hang in the street for 15 nights every winter.
      | 每年冬天，下文山的60盏灯笼要在街上挂15个晚上。
      Each of them is checked by Madam Qiu before it is lit.
      | 每一盏在点亮之前都由邱女士检查。
      ¶ Wipe the frame with a dry cloth, and never use water or oil.
      | 用干布擦拭框架，切勿使用水或油。
      A torn sheet is replaced with paper of 80 g, glued on from the inside.
      | 破损的纸面要换上80克的纸，从里面粘好。
      """;

  private static final String CHINESE_AFTER =
      """
      ¶ After the last night the lanterns are folded and put into 5 wooden boxes.
      | 最后一晚过后，灯笼折好，放进5个木箱。
      The boxes stand in the school, under the stairs, where it is cool and dry.
      | 木箱放在学校的楼梯下面，那里阴凉干燥。
      ¶ Who wants to help?
      | 谁愿意帮忙？
      Come to the well on 20 December at 9 o'clock, and bring gloves.
      | 请于12月20日9点到井边来，并带上手套。
      """;

  private static final String HEBREW_BEFORE =
      """
      ¶# The seed library
      | # ספריית הזרעים
      ¶ The library in Kfar Tamir keeps 310 kinds of seeds in small glass jars.
      | הספרייה בכפר תמיר שומרת 310 סוגי זרעים בצנצנות זכוכית קטנות.
      Every member may take 5 envelopes in spring, without paying anything.
      | כל חבר רשאי לקחת 5 מעטפות באביב, בלי לשלם דבר.
      ¶ In autumn you bring back twice as many seeds, dry and clean.
      | בסתיו מחזירים כמות כפולה של זרעים, יבשים ונקיים.
      Noa Barlev weighs them and writes the year on the lid.
      | נועה ברלב שוקלת אותם וכותבת את השנה על המכסה.
      """;

  private static final String HEBREW_AFTER =
      """
      ¶ The room is kept at 12 degrees, and the door must not stand open.
      | בחדר שומרים על 12 מעלות, ואסור שהדלת תישאר פתוחה.
      Would you like to see the oldest jar?
      | רוצים לראות את הצנצנת העתיקה ביותר?
      It was filled in 1968 with beans that still grow in 3 gardens of the village.
      | היא מולאה בשנת 1968 בשעועית שעדיין גדלה ב-3 גינות בכפר.
      """;

  @Test
  void aFaithfulJapaneseTranslationIsSilent() {
    PairCheck.of("en", "ja").check(JAPANESE_BEFORE, JAPANESE_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInJapanese() {
    PairCheck.of("en", "ja")
        .check(
            JAPANESE_BEFORE,
            """
            ¶ If the cabin stops on the way, stay calm and remain in your seat.
            | ゴンドラが途中で止まったら、落ち着いて席にいてください。
            The guard will speak to you through the loudspeaker within 2 minutes and tell you what to do.
            | - !omission
            Nobody has ever had to wait for longer than half an hour.
            | これまで30分以上待った人はいません。
            """,
            JAPANESE_AFTER);
  }

  @Test
  void aFaithfulChineseTranslationIsSilent() {
    PairCheck.of("en", "zh").check(CHINESE_BEFORE, CHINESE_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInChinese() {
    PairCheck.of("en", "zh")
        .check(
            CHINESE_BEFORE,
            """
            ¶ The candles burn for 4 hours and are changed at midnight by the night watch.
            | 蜡烛能燃4个小时，由守夜人在午夜更换。
            Whoever sees smoke rings the bell at the corner and does not try to pull the lantern down alone.
            | - !omission
            Children may carry the small lanterns, but not the red ones.
            | 孩子们可以提小灯笼，但不能提红色的。
            """,
            CHINESE_AFTER);
  }

  /** A character says as much as three letters; what is copied is as long as in the source. */
  @Test
  void aSentenceCutShortIsFoundInChinese() {
    PairCheck.of("en", "zh")
        .check(
            CHINESE_BEFORE,
            """
            ¶ The candles burn for 4 hours and are changed at midnight by the night watch.
            | 蜡烛能燃4个小时，由守夜人在午夜更换。
            Write the name of the maker, Qiu & Daughters, on the rim with a brush, let it dry for an
            | 用毛笔写上名字 Qiu & Daughters。 !length
            The workshop of Qiu & Daughters sends new frames by Wenshan Parcel Post.
            | Qiu & Daughters 的作坊通过 Wenshan Parcel Post 寄来新的框架。
            """
                .replace(
                    "dry for an",
                    "dry for an hour, and hang the lantern in the yard until the night watch has come"
                        + " round to see whether the letters can be read from the other side."),
            CHINESE_AFTER);
  }

  @Test
  void anAddedSentenceIsFoundInChinese() {
    PairCheck.of("en", "zh")
        .check(
            CHINESE_BEFORE,
            """
            ¶ The candles burn for 4 hours and are changed at midnight by the night watch.
            | 蜡烛能燃4个小时，由守夜人在午夜更换。
            -
            | 据说很久以前有一盏灯笼被风吹走，第二天早上在河对岸的树上找到了。 !addition
            Children may carry the small lanterns, but not the red ones.
            | 孩子们可以提小灯笼，但不能提红色的。
            """,
            CHINESE_AFTER);
  }

  @Test
  void aFaithfulHebrewTranslationIsSilent() {
    PairCheck.of("en", "he").check(HEBREW_BEFORE, HEBREW_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInHebrew() {
    PairCheck.of("en", "he")
        .check(
            HEBREW_BEFORE,
            """
            ¶ Seeds that float in water are thrown to the hens of the neighbours.
            | זרעים שצפים במים נזרקים לתרנגולות של השכנים.
            Seeds that sink are spread on a wooden tray and turned over every evening for 9 days.
            | - !omission
            Damp envelopes are sent back at once, whoever wrote on them.
            | מעטפות לחות נשלחות חזרה מיד, לא חשוב מי כתב עליהן.
            """,
            HEBREW_AFTER);
  }
}
