package dev.tallystick.pairing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
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
  private static final String[] SOURCES = {
    "{path}.md", "en/{path}.md", "{path}.{tag}.md", "{tag}/{path}.txt", "a.md", "docs/{path}"
  };
  private static final String[] TARGETS = {
    "{path}.{tag}.md", "{tag}/{path}.md", "{path}_{tag}.txt", "de/{path}.md", "b.md", "is/{path}"
  };
  private static final String[] GLOBS = {"docs", "**/my*", "*_it.*", "{no,src}/**/b*", "[!a-z]*"};
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
  void whatAProjectStatesLeavesTheOtherFilesAsIfItsOwnWereNotThere() {
    for (int seed = 0; seed < 300; seed++) {
      Random random = new Random(seed);
      List<String> paths = new ArrayList<>(paths(random, 2 + random.nextInt(60)));
      Rules rules = stated(random, paths);
      Pairs pairs = Pairing.pairs(paths, rules);
      checkStated(paths, pairs, rules, "seed " + seed);
      Set<String> rest = new HashSet<>(paths);
      rest.removeIf(path -> rules.ignoring(path).isPresent());
      StatedPairs own = new StatedPairs(new TreeSet<>(rest), rules);
      rest.removeIf(own::has);
      Pairs others = Pairing.pairs(rest, new Rules(rules.sourceLanguage(), rules.targetLanguage()));
      assertEquals(others.ambiguities(), pairs.ambiguities(), "seed " + seed);
      List<Pair> byTags = new ArrayList<>(pairs.pairs());
      byTags.removeIf(pair -> pair.why() == Why.PROJECT);
      assertEquals(others.pairs(), byTags, "seed " + seed);
      Collections.shuffle(paths, random);
      assertEquals(pairs, Pairing.pairs(paths, rules), "seed " + seed);
    }
  }

  private static Rules stated(Random random, List<String> paths) {
    List<PairRule> stated = new ArrayList<>();
    for (int i = random.nextInt(4); i >= 0; i--) {
      boolean patterns = random.nextBoolean();
      String source = patterns ? pick(random, SOURCES) : paths.get(random.nextInt(paths.size()));
      String target = patterns ? pick(random, TARGETS) : paths.get(random.nextInt(paths.size()));
      stated.add(
          new PairRule(
              PathPattern.of(source),
              PathPattern.of(target),
              Language.of(pick(random, SETTINGS)),
              Language.of(pick(random, SETTINGS))));
    }
    List<Glob> ignored = new ArrayList<>();
    for (int i = random.nextInt(3); i > 0; i--) {
      ignored.add(Glob.of(pick(random, GLOBS)).orElseThrow());
    }
    return new Rules(
        Language.of(pick(random, SETTINGS)), Language.of(pick(random, SETTINGS)), stated, ignored);
  }

  /** No file is lost, none has two sources or two languages, and none comes from itself. */
  private static void checkStated(List<String> paths, Pairs pairs, Rules rules, String seed) {
    Map<String, String> sources = new HashMap<>();
    Map<String, Language> languages = new HashMap<>();
    Set<String> places = new TreeSet<>();
    for (Pair pair : pairs.pairs()) {
      assertNull(sources.put(pair.target(), pair.source()), seed);
      checkLanguage(languages, pair.source(), pair.sourceLanguage(), seed);
      checkLanguage(languages, pair.target(), pair.targetLanguage(), seed);
      assertTrue(rules.wants(pair.targetLanguage()), seed);
      places.addAll(List.of(pair.source(), pair.target()));
    }
    for (String target : sources.keySet()) {
      Set<String> way = new HashSet<>();
      for (String at = target; at != null; at = sources.get(at)) {
        assertTrue(way.add(at), seed);
      }
    }
    for (Alone alone : pairs.alone()) {
      assertTrue(places.add(alone.file()), seed);
      boolean ignored = rules.ignoring(alone.file()).isPresent();
      assertEquals(ignored, alone.reason().startsWith("tallystick.json ignores it"), seed);
    }
    pairs
        .ambiguities()
        .forEach(open -> open.files().forEach(file -> assertTrue(places.add(file), seed)));
    assertEquals(new TreeSet<>(paths), places, seed);
  }

  private static void checkLanguage(
      Map<String, Language> languages, String file, Language language, String seed) {
    Language before = languages.put(file, language);
    assertTrue(before == null || before.equals(language), seed);
  }

  @Test
  void tenThousandPathsEnd() {
    List<String> paths = new ArrayList<>();
    for (int i = 0; i < 2500; i++) {
      String rest = "part" + i % 50 + "/is/page" + i + ".md";
      paths.addAll(List.of("en/" + rest, "de/" + rest, "docs/" + rest, "pt_BR/" + rest));
    }
    // Each compared with each would take minutes; the limit leaves room for a busy machine.
    Pairs first = Pairing.pairs(paths, Rules.NONE);
    Pairs pairs = assertTimeout(Duration.ofSeconds(20), () -> Pairing.pairs(paths, Rules.NONE));
    assertEquals(first, pairs);
    assertEquals(5000, pairs.pairs().size());
    assertEquals(2500, pairs.alone().size());
  }

  @Test
  void tenThousandPathsAndFiftyRulesInAFewSeconds() {
    List<String> paths = new ArrayList<>();
    List<PairRule> stated = new ArrayList<>();
    List<Glob> ignored = new ArrayList<>();
    for (int i = 0; i < 50; i++) {
      for (int page = 0; page < 100; page++) {
        String rest = "part" + i + "/chapter/page" + page + ".md";
        paths.addAll(List.of("text/" + rest, "i18n/de/" + rest));
      }
      PathPattern source = PathPattern.of("{path}/part" + i + "/{path}.md");
      PathPattern own = PathPattern.of("text/part" + i + "/{path}.md");
      PathPattern target = PathPattern.of("i18n/{tag}/part" + i + "/{path}.md");
      stated.add(new PairRule(source, target, Optional.empty(), Optional.empty()));
      stated.add(new PairRule(own, target, Optional.empty(), Optional.empty()));
      ignored.add(Glob.of("**/*draft" + i + "*/**").orElseThrow());
    }
    Rules rules = new Rules(Optional.empty(), Optional.empty(), stated, ignored);
    Pairs pairs = assertTimeout(Duration.ofSeconds(20), () -> Pairing.pairs(paths, rules));
    assertEquals(5000, pairs.pairs().size());
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
