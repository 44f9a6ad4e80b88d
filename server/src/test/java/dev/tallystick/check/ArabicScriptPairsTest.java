package dev.tallystick.check;

import org.junit.jupiter.api.Test;

/**
 * Arabic, Persian and Urdu: from right to left, with full stops, question marks, semicolons,
 * quotation marks and digits of their own.
 */
class ArabicScriptPairsTest {
  private static final String ARABIC_BEFORE =
      """
      ¶# The library bus
      | # حافلة الكتب
      ¶ The library bus of Wadi Nisrin carries 900 books and stops in 14 villages.
      | تحمل حافلة الكتب في وادي نسرين 900 كتاب وتتوقف في 14 قرية.
      It leaves at 7:30, except on Fridays and when the river is high.
      | تنطلق في الساعة 7:30، إلا أيام الجمعة وحين يرتفع النهر.
      ¶ The driver, Salma Haddad, knows every reader by name.
      | السائقة سلمى حداد تعرف كل قارئ باسمه.
      She says: "Whoever returns a book late tells me its story."
      | تقول: «من يتأخر في إعادة كتاب يحكي لي قصته.»
      """;

  private static final String ARABIC_AFTER =
      """
      ¶ Would you like to borrow a book?
      | هل تريد استعارة كتاب؟
      Then bring your card, which costs 5 dirhams a year.
      | إذن أحضر بطاقتك التي تكلف 5 دراهم في السنة.
      ¶ Books with pictures go on the lower shelf; the heavy atlases stay in the net above the wheel.
      | توضع الكتب المصورة على الرف السفلي؛ أما الأطالس الثقيلة فتبقى في الشبكة فوق العجلة.
      In 2019 nobody lost a single page.
      | في عام 2019 لم يضيع أحد صفحة واحدة.
      """;

  private static final String PERSIAN_BEFORE =
      """
      ¶# The ice house
      | # یخچال قدیمی
      ¶ The ice house of Baghestan was built 240 years ago from mud brick.
      | یخچال باغستان ۲۴۰ سال پیش از خشت خام ساخته شد.
      Its dome is 15 m high, and the pit below holds 60 tonnes of ice.
      | گنبد آن ۱۵ متر ارتفاع دارد و گودال زیر آن ۶۰ تن یخ جا می‌دهد.
      ¶ Who may enter?
      | چه کسی اجازه‌ی ورود دارد؟
      Only the keeper, Mr. Sohrabi, and guests who wear felt shoes.
      | فقط نگهبان، آقای سهرابی، و مهمانانی که کفش نمدی پوشیده‌اند.
      On the door is written: "Close me quickly!"
      | روی در نوشته شده است: «مرا زود ببندید!»
      """;

  private static final String PERSIAN_AFTER =
      """
      ¶ In winter the shallow pools are filled every night at 22:00.
      | در زمستان حوضچه‌های کم‌عمق هر شب ساعت ۲۲:۰۰ پر می‌شوند.
      Before sunrise the ice is broken with poles and carried into the pit.
      | پیش از طلوع آفتاب یخ را با دیرک می‌شکنند و به گودال می‌برند.
      ¶ A layer of straw lies between the ice and the wall; it is changed once in 3 years.
      | میان یخ و دیوار لایه‌ای کاه هست؛ هر ۳ سال یک بار عوض می‌شود.
      Nobody has seen the bottom of the pit since 1961.
      | از سال ۱۹۶۱ کسی کف گودال را ندیده است.
      """;

  private static final String URDU_BEFORE =
      """
      ¶# The kite workshop
      | # پتنگوں کی ورکشاپ
      ¶ The workshop in Mohalla Nur makes 350 kites a week from paper and bamboo.
      | محلہ نور کی ورکشاپ ہر ہفتے کاغذ اور بانس سے 350 پتنگیں بناتی ہے۔
      Each of them is tested on the roof before it is sold.
      | ہر پتنگ کو بیچنے سے پہلے چھت پر آزمایا جاتا ہے۔
      ¶ Where do the bamboo sticks come from?
      | بانس کی تیلیاں کہاں سے آتی ہیں؟
      They come by train from the south and dry for 40 days under the stairs.
      | یہ جنوب سے ریل گاڑی میں آتی ہیں اور 40 دن سیڑھیوں کے نیچے سوکھتی ہیں۔
      Master Yaqub says, "A wet stick never flies straight."
      | استاد یعقوب کہتے ہیں، “گیلی تیلی کبھی سیدھی نہیں اڑتی۔”
      """;

  private static final String URDU_AFTER =
      """
      ¶ The glue is boiled from flour and water, and a pinch of salt keeps it fresh for 6 days.
      | گوند آٹے اور پانی سے پکائی جاتی ہے، اور ایک چٹکی نمک اسے 6 دن تازہ رکھتا ہے۔
      Children may cut the tails, but the scissors stay on the table.
      | بچے دُمیں کاٹ سکتے ہیں، لیکن قینچی میز پر ہی رہتی ہے۔
      ¶ In spring the whole street flies kites until 20:00, and nobody complains about the noise.
      | بہار میں پوری گلی رات 20:00 بجے تک پتنگ اڑاتی ہے، اور شور کی شکایت کوئی نہیں کرتا۔
      """;

  @Test
  void aFaithfulArabicTranslationIsSilent() {
    PairCheck.of("en", "ar").check(ARABIC_BEFORE, ARABIC_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInArabic() {
    PairCheck.of("en", "ar")
        .check(
            ARABIC_BEFORE,
            """
            ¶ Read in the shade, because the sun turns the paper yellow.
            | اقرأ في الظل، لأن الشمس تجعل الورق أصفر.
            Wash your hands before you open a book, and never fold the corner of a page to mark your place.
            | - !omission
            If a page is torn, tell the driver, who keeps 3 pots of glue in the box under her seat.
            | إذا تمزقت صفحة فأخبر السائقة، فهي تحتفظ بـ 3 علب من الصمغ في الصندوق تحت مقعدها.
            """,
            ARABIC_AFTER);
  }

  @Test
  void anAddedSentenceIsFoundInArabic() {
    PairCheck.of("en", "ar")
        .check(
            ARABIC_BEFORE,
            """
            ¶ Read in the shade, because the sun turns the paper yellow.
            | اقرأ في الظل، لأن الشمس تجعل الورق أصفر.
            -
            | كانت جدتي تقرأ لنا كل مساء تحت شجرة التين حتى يغلبنا النوم جميعا. !addition
            If a page is torn, tell the driver, who keeps 3 pots of glue in the box under her seat.
            | إذا تمزقت صفحة فأخبر السائقة، فهي تحتفظ بـ 3 علب من الصمغ في الصندوق تحت مقعدها.
            """,
            ARABIC_AFTER);
  }

  @Test
  void aFaithfulPersianTranslationIsSilent() {
    PairCheck.of("en", "fa").check(PERSIAN_BEFORE, PERSIAN_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInPersian() {
    PairCheck.of("en", "fa")
        .check(
            PERSIAN_BEFORE,
            """
            ¶ Visitors pay at the blue booth and get a ticket with a number.
            | بازدیدکنندگان در باجه‌ی آبی پول می‌دهند و بلیتی شماره‌دار می‌گیرند.
            Keep the ticket until you have left the dome, because the guard counts the people who come out again.
            | - !omission
            Dogs wait in the shade of the mulberry tree, where there is a bowl of water.
            | سگ‌ها در سایه‌ی درخت توت منتظر می‌مانند، جایی که یک کاسه آب هست.
            """,
            PERSIAN_AFTER);
  }

  @Test
  void aFaithfulUrduTranslationIsSilent() {
    PairCheck.of("en", "ur").check(URDU_BEFORE, URDU_AFTER);
  }

  @Test
  void aMissingSentenceIsFoundInUrdu() {
    PairCheck.of("en", "ur")
        .check(
            URDU_BEFORE,
            """
            ¶ Bend the stick slowly over the steam of the kettle.
            | تیلی کو کیتلی کی بھاپ پر آہستہ آہستہ موڑیے۔
            Hold it in that shape with both hands and count to 90 before you tie it to the cross.
            | - !omission
            Then glue the paper on, beginning at the upper corner.
            | پھر اوپر کے کونے سے شروع کر کے کاغذ چپکائیے۔
            """,
            URDU_AFTER);
  }
}
