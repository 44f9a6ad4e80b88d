package dev.tallystick.pairing;

import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * Files that are versions of one another.
 *
 * @param stem what their paths share when the tags are taken out
 * @param members one reading of each file, in the order of their paths
 */
record Group(String stem, List<Tagged> members) {

  /** The languages in the tags. */
  SortedSet<Language> languages() {
    SortedSet<Language> languages = new TreeSet<>();
    for (Tagged member : members) {
      if (!member.isPlain()) {
        languages.add(member.language());
      }
    }
    return languages;
  }

  /** The version without a tag. */
  Optional<Tagged> plain() {
    return members.stream().filter(Tagged::isPlain).findFirst();
  }

  /** Whether it has two versions that differ in language. */
  boolean isTranslated() {
    return members.stream().map(Tagged::language).distinct().limit(2).count() == 2;
  }

  /** The members in a language; {@link Language#UNKNOWN} is that of the version without a tag. */
  List<Tagged> in(Language language) {
    return members.stream().filter(member -> member.language().equals(language)).toList();
  }

  /** The members in any other language. */
  List<Tagged> notIn(Language language) {
    return members.stream().filter(member -> !member.language().equals(language)).toList();
  }
}
