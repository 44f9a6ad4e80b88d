package dev.tallystick.segment;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Borders in scripts other than Latin. Our own sentences; what is customary is from memory. */
class OtherBordersTest {
  @Test
  void greekAndCyrillic() {
    BorderTable.of("el")
        .check(
            """
            Ρωτήστε τον κ. Παππά και τη Δρ. Νίκου. / Έχουν το κλειδί.
            Πού είναι ο μύλος; / Δίπλα στο ποτάμι.
            Πού είναι ο μύλος\u037E / Δίπλα στο ποτάμι.
            Δείτε την εικ. 3 και τη σελ. 4. / Μετά συνεχίστε.
            Πάρτε π.χ. Νερό και ψωμί. / Τίποτα άλλο.
            Σχοινιά, γάντζοι κ.λπ. / Όλα είναι στεγνά.
            """);
    BorderTable.of("ru")
        .check(
            """
            Спросите г. Лебедева и проф. Орлову. / У них ключ.
            Это было в 1990 г. / Потом пришла вода.
            См. рис. 3 и стр. 4. / Затем идите дальше.
            Верёвки, крюки и т. д. / Всё сухое.
            Верёвки, т.е. Канаты, сухие. / Это важно.
            Мы управляем им. / Управление простое.
            Он вышел из порта B. / Единственный путь был закрыт.
            «Стой!» — крикнула она. / Он замер.
            А. С. Лебедев написал это. / Он умер.
            """);
    BorderTable.of("uk")
        .check(
            """
            Спитайте п. Лисенка і проф. Орлову. / У них ключ.
            Див. рис. 3 і стор. 4. / Потім ідіть далі.
            Мотузки, гаки і т. д. / Усе сухе.
            """);
  }

  @Test
  void chinese() {
    BorderTable.dense("zh")
        .check(
            """
            水磨在河边。 / “老磨”早上转动！ / 谁来看？
            他说：“走开。” / 然后走了。
            文件在这里。 / (旧的在那里。) / 请看。
            打开它。 / -R 选项关闭它。
            规则在这里。 / .htaccess 文件在那里。
            看图。 / 9.5.1. 时间
            # today: an ellipsis without a blank behind it ends sentences and stands inside of them
            我们看看吧……水磨很旧。
            """);
  }

  @Test
  void japanese() {
    BorderTable.dense("ja")
        .check(
            """
            水車は川にあります。 / 「古い水車」は朝に回ります。
            「止まれ！」 / はい、止まります。
            「止まれ！」と言いました。 / 誰も動きません。
            彼は「もう遅い。」と言って帰りました。 / 門は閉まりました。
            水車は古い（1874年！）。 / 見に来てください。
            水車は古い。 / （今も回ります。） / 車輪は新しい。
            水車は古い。 / "open" と書いてあります。 / "shut" ではありません。
            「tide.example」と入力します。 / 組織名。 / 町の名。
            設定を書きます。 / .conf ファイルは最後に読みます。
            本当?! / はい。
            開く。 / 閉じる。
            # today: an ellipsis without a blank behind it ends sentences and stands inside of them
            綱、鉤、板…すべて乾いています。
            """);
  }

  @Test
  void indianAndArabicScripts() {
    BorderTable.of("hi")
        .check(
            """
            चक्की नदी पर है। / वह सुबह चलती है।
            डॉ. शर्मा के पास चाबी है। / वे कल आएँगे।
            क्या वह खुली है? / हाँ, खुली है॥
            """);
    BorderTable.of("ur")
        .check("چکی دریا پر ہے۔ / وہ صبح چلتی ہے۔ / کیا وہ کھلی ہے؟ / جی ہاں، کھلی ہے۔");
    BorderTable.of("ar")
        .check(
            """
            اسألوا د. سامي عن الباب. / المفتاح عنده.
            أين الطاحونة؟ / عند النهر. / تعالوا غدا!
            """);
    BorderTable.of("he").check("היכן הטחנה? / ליד הנהר. / בואו מוקדם!");
    BorderTable.of("hy").check("Ջրաղացը գետի մոտ է։ / Այն հին է։");
    BorderTable.of("am").check("ወፍጮው ከወንዙ አጠገብ ነው። / አሮጌ ነው።");
  }

  @Test
  void southEastAsianScripts() {
    BorderTable.of("km").check("កង្ហារទឹកនៅជិតទន្លេ។ / វាចាស់ហើយ។");
    BorderTable.of("my").check("ရေစက်သည် မြစ်နားမှာ၊ ရွာနားမှာ ရှိသည်။ / ဟောင်းပြီ။");
    BorderTable.of("th")
        .check(
            """
            กังหันน้ำอยู่ริมแม่น้ำ มีอายุ 150 ปี และยังหมุนอยู่
            กังหันน้ำอยู่ริมแม่น้ำครับ / ตอนเช้ามันหมุน
            กังหันน้ำอยู่ริมแม่น้ำ / นอกจากนี้ยังมีสะพานเก่า
            ดร. สมชาย มีกุญแจ
            """);
  }

  /** A long blank parts Thai sentences; the end of a line does not, as lines are wrapped. */
  @Test
  void longBlanksPartThai() {
    assertEquals(
        List.of("กังหันน้ำอยู่ริมแม่น้ำ", "ตอนเช้ามันหมุน"),
        Sentences.of("th", "กังหันน้ำอยู่ริมแม่น้ำ  ตอนเช้ามันหมุน"));
    assertEquals(1, Sentences.inFile("th", "กังหันน้ำอยู่ริมแม่น้ำ\r\nตอนเช้ามันหมุน").size());
  }
}
