package dev.tallystick.engine;

import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;

/** The questions that wait for their answers. */
final class Questions {
  private final List<Waiting> waiting = new ArrayList<>();

  /** A question, and the text that it was asked of. */
  private record Waiting(Question question, Text text) {}

  /** The pairs that questions about texts rest on: somebody waits for them. */
  Set<FilePair> awaited(Collection<FilePair> pairs) {
    Set<FilePair> awaited = new HashSet<>();
    for (Waiting one : waiting) {
      if (one.question().aboutText()) {
        awaited.addAll(one.question().pairs(pairs));
      }
    }
    return awaited;
  }

  /** Finds answers. */
  @FunctionalInterface
  interface Oracle {
    Known answer(Question question, Text text);
  }

  /** Someone asks, of the text as it is now. */
  void add(Question question, Optional<Document> document) {
    waiting.add(new Waiting(question, document.map(Document::text).orElse(new Text(""))));
  }

  /** Nobody waits for this one any more. */
  void remove(Question question) {
    waiting.removeIf(one -> one.question() == question);
  }

  /** The user does not want the folders looked at any more: no answer would be about all of one. */
  void decline() {
    for (Iterator<Waiting> all = waiting.iterator(); all.hasNext(); ) {
      Question question = all.next().question();
      if (!question.aboutText()) {
        all.remove();
        question.reply().outdated();
      }
    }
  }

  /** A text was edited: who asked about it, or about its counterpart, asked about another text. */
  void edited(Path file, Collection<FilePair> pairs) {
    for (Iterator<Waiting> all = waiting.iterator(); all.hasNext(); ) {
      Question question = all.next().question();
      boolean concerned = question.pairs(pairs).stream().anyMatch(pair -> pair.has(file));
      if (question.aboutText() && (concerned || question.file().equals(file))) {
        all.remove();
        question.reply().outdated();
      }
    }
  }

  /** Answers those that can be answered now; of a file that is not open there is nothing to say. */
  void answer(Collection<Path> open, Predicate<Question> ready, Oracle oracle) {
    for (Iterator<Waiting> all = waiting.iterator(); all.hasNext(); ) {
      Waiting one = all.next();
      Question question = one.question();
      if (ready.test(question)) {
        all.remove();
        boolean shown = !question.aboutText() || open.contains(question.file());
        question.reply().answer(shown ? oracle.answer(question, one.text()) : Known.NOTHING);
      }
    }
  }
}
