package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

class PairingLawsTest {
  private static final String[] FOLDERS = {"en/", "de/", "pt_BR/", "is/", "docs/", "src/", "no/"};
  private static final String[] STEMS = {"a", "b", "my", "to.do"};
  private static final String[] TAGS = {"", "", ".de", "_en", ".fr", "_pt_BR", ".zh-Hant", "_it"};
  private static final String[] EXTENSIONS = {".md", ".txt"};
  private static final String[] SETTINGS = {"", "", "en", "de", "pt", "pt-BR", "xx"};

  @Test
  void everyFileIsInOnePlaceWhateverTheOrder() {
    for (int seed = 0; seed < 200; seed++) {
      Random random = new Random(seed);
      List<String> paths = new ArrayList<>(paths(random, 2 + random.nextInt(60)));
      Rules rules =
          new Rules(Language.of(pick(random, SETTINGS)), Language.of(pick(random, SETTINGS)));
      Pairs pairs = Pairing.pairs(paths, rules);
      checkPlaces(paths, pairs, "seed " + seed);
      checkPairs(pairs, rules, "seed " + seed);
      Collections.shuffle(paths, random);
      assertEquals(pairs, Pairing.pairs(paths, rules), "seed " + seed);
    }
  }

  @Test
  void tenThousandPathsInWellUnderASecond() {
    List<String> paths = new ArrayList<>();
    for (int i = 0; i < 2500; i++) {
      String rest = "part" + i % 50 + "/is/page" + i + ".md";
      paths.addAll(List.of("en/" + rest, "de/" + rest, "docs/" + rest, "pt_BR/" + rest));
    }
    // The first run pays for loading ICU.
    Pairs first = Pairing.pairs(paths, Rules.NONE);
    Pairs pairs = assertTimeout(Duration.ofSeconds(1), () -> Pairing.pairs(paths, Rules.NONE));
    assertEquals(first, pairs);
    assertEquals(5000, pairs.pairs().size());
    assertEquals(2500, pairs.alone().size());
  }

  @Test
  void groupOfManyVersionsInLinearTime() {
    List<Tagged> members = new ArrayList<>();
    for (int i = 0; i < 40_000; i++) {
      String tag = "v" + i / 2;
      Language language = new Language(i < 20_000 ? "en" : tag);
      members.add(new Tagged(tag + i, "a.md", language, tag, "a.//" + i % 10_000, 0, Why.NAME));
    }
    Group group = new Group("a.md", members);
    GroupPairs found =
        assertTimeout(
            Duration.ofSeconds(3), () -> new GroupPairs(group, new Language("en"), Rules.NONE));
    assertEquals(20_000, found.pairs().size());
    assertEquals(10_000, found.alone().size());
  }

  private static void checkPlaces(List<String> paths, Pairs pairs, String seed) {
    Set<String> sources = new TreeSet<>();
    List<String> places = new ArrayList<>();
    for (Pair pair : pairs.pairs()) {
      sources.add(pair.source());
      places.add(pair.target());
    }
    places.addAll(sources);
    pairs.alone().forEach(lone -> places.add(lone.file()));
    pairs.ambiguities().forEach(open -> places.addAll(open.files()));
    Collections.sort(places);
    assertEquals(new ArrayList<>(new TreeSet<>(paths)), places, seed);
  }

  private static void checkPairs(Pairs pairs, Rules rules, String seed) {
    Set<String> targets = new HashSet<>();
    for (Pair pair : pairs.pairs()) {
      assertTrue(targets.add(pair.target()), seed);
      assertEquals(extension(pair.source()), extension(pair.target()), seed);
      Optional<Language> wanted = rules.targetLanguage();
      assertTrue(wanted.isEmpty() || wanted.get().covers(pair.targetLanguage()), seed);
    }
    for (Ambiguity open : pairs.ambiguities()) {
      assertTrue(open.choices().size() > 1, seed);
    }
  }

  private static Set<String> paths(Random random, int count) {
    Set<String> paths = new HashSet<>();
    for (int i = 0; i < count; i++) {
      StringBuilder path = new StringBuilder();
      for (int depth = random.nextInt(3); depth > 0; depth--) {
        path.append(pick(random, FOLDERS));
      }
      path.append(pick(random, STEMS)).append(pick(random, TAGS)).append(pick(random, EXTENSIONS));
      paths.add(path.toString());
    }
    return paths;
  }

  private static String extension(String path) {
    return path.substring(path.lastIndexOf('.'));
  }

  private static String pick(Random random, String[] from) {
    return from[random.nextInt(from.length)];
  }
}
