package dev.tallystick.check;

import org.junit.jupiter.api.Test;

class SpanishAndRussianPairsTest {
  private static final String SPANISH_BEFORE =
      """
      ¶# Rules of the night swim
      | # Normas del baño nocturno
      ¶ The pool of Monte Arlo is open at night from 1 June to 15 September.
      | La piscina de Monte Arlo abre por la noche del 1 de junio al 15 de septiembre.
      Leave your shoes under the bench, and take one of the 40 numbered towels.
      | Deje los zapatos bajo el banco y tome una de las 40 toallas numeradas.
      ¶ Ines Valdor, who guards the pool, sits on the high chair until midnight.
      | Inés Valdor, que vigila la piscina, está en la silla alta hasta medianoche.
      She whistles once for silence and twice for danger.
      | Silba una vez para pedir silencio y dos veces si hay peligro.
      """;

  private static final String SPANISH_AFTER =
      """
      ¶ The deep end is 3.8 m deep, and its lamps go out at half past eleven.
      | La parte honda tiene 3,8 m de profundidad, y sus lámparas se apagan a las once y media.
      Can you not swim well?
      | ¿No nada usted bien?
      Stay where you can see the blue line.
      | Quédese donde pueda ver la línea azul.
      ¶ Whoever has lost something asks at the kiosk, where 2 baskets are kept for a month.
      | Quien haya perdido algo pregunta en el quiosco, donde se guardan 2 cestas durante un mes.
      Glasses are given back only to those who can read the small print on the label.
      | Las gafas solo se devuelven a quien pueda leer la letra pequeña de la etiqueta.
      """;

  private static final String RUSSIAN_BEFORE =
      """
      ¶# The weather post on Mount Sarn
      | # Метеопост на горе Сарн
      ¶ The post stands at 2140 m and is manned by 3 people all year round.
      | Пост стоит на высоте 2140 м, и круглый год на нём работают 3 человека.
      Anton Velik writes down the wind every 6 hours, even at Christmas.
      | Антон Велик записывает ветер каждые 6 часов, даже на Рождество.
      The snow is measured with a pole that has been repaired more often than the roof.
      | Снег измеряют шестом, который чинили чаще, чем крышу.
      ¶ The lift takes 18 minutes and does not run when the wind is above 20 m/s.
      | Подъёмник идёт 18 минут и не работает, если ветер сильнее 20 м/с.
      """;

  private static final String RUSSIAN_AFTER =
      """
      ¶ In winter the flour, the lamp oil and the letters are brought up on foot.
      | Зимой муку, керосин и письма поднимают наверх пешком.
      Each load weighs 25 kg, and the path has 7 shelters with a stove and dry wood.
      | Каждый груз весит 25 кг, а на тропе есть 7 приютов с печкой и сухими дровами.
      ¶ Visitors are welcome, but they must carry their own bread.
      | Гостям здесь рады, но хлеб они должны нести сами.
      On the way down nobody carries anything but news.
      | На обратном пути никто не несёт ничего, кроме новостей.
      """;

  private static void spanish(String middle) {
    PairCheck.of("en", "es").check(SPANISH_BEFORE, middle, SPANISH_AFTER);
  }

  private static void russian(String middle) {
    PairCheck.of("en", "ru").check(RUSSIAN_BEFORE, middle, RUSSIAN_AFTER);
  }

  @Test
  void aFaithfulSpanishTranslationIsSilent() {
    spanish("");
  }

  @Test
  void aMissingSentenceIsFoundInSpanish() {
    spanish(
        """
        ¶ Children under 10 go home when the bell of Santa Rufa strikes nine.
        | Los niños menores de 10 años se van a casa cuando la campana de Santa Rufa da las nueve.
        Their parents may stay if a neighbour takes the children with her and signs the list.
        | - !omission
        No glass is allowed near the water, neither bottles nor cups.
        | No se permite vidrio cerca del agua, ni botellas ni tazas.
        """);
  }

  @Test
  void twoMissingSentencesAreOneOmissionInSpanish() {
    spanish(
        """
        ¶ Children under 10 go home when the bell of Santa Rufa strikes nine.
        | Los niños menores de 10 años se van a casa cuando la campana de Santa Rufa da las nueve.
        Their parents may stay if a neighbour takes the children with her and signs the list.
        | - !omission
        The list hangs on the third hook and is burnt at the end of the season.
        | - !...
        No glass is allowed near the water, neither bottles nor cups.
        | No se permite vidrio cerca del agua, ni botellas ni tazas.
        """);
  }

  @Test
  void aFaithfulRussianTranslationIsSilent() {
    russian("");
  }

  @Test
  void aMissingSentenceIsFoundInRussian() {
    russian(
        """
        ¶ The radio is switched on at 7.30 and at 19.30, and never on a whim.
        | Рацию включают в 7.30 и в 19.30, и никогда просто так.
        If the aerial is covered with ice, one of the three climbs out and knocks it off with a broom.
        | - !omission
        The battery lasts for 5 days when the sun does not come out.
        | Если солнце не выходит, батареи хватает на 5 дней.
        """);
  }

  @Test
  void anUntranslatedIslandIsFoundInRussian() {
    russian(
        """
        ¶ The battery lasts for 5 days when the sun does not come out.
        | The battery lasts for 5 days when the sun does not come out. !untranslated
        """);
  }

  @Test
  void anAddedSentenceIsFoundInRussian() {
    russian(
        """
        ¶ The radio is switched on at 7.30 and at 19.30, and never on a whim.
        | Рацию включают в 7.30 и в 19.30, и никогда просто так.
        -
        | Говорят, что однажды в бурю её слышали даже рыбаки на другом берегу залива. !addition
        The battery lasts for 5 days when the sun does not come out.
        | Если солнце не выходит, батареи хватает на 5 дней.
        """);
  }
}
