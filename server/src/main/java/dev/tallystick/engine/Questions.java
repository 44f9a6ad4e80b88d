package dev.tallystick.engine;

import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/** The questions that wait for their answers. */
final class Questions {
  private final List<Waiting> waiting = new ArrayList<>();

  /** A question, and the offset that it is about in the text it was asked of. */
  private record Waiting(Question question, int offset) {}

  /** Finds answers. */
  @FunctionalInterface
  interface Oracle {
    Answer answer(Path file, int offset);
  }

  /** Someone asks; the place is looked up in the text as it is now. */
  void add(Question question, Optional<Document> document) {
    Text text = document.map(Document::text).orElse(new Text(""));
    waiting.add(new Waiting(question, question.offset(text)));
  }

  /** Nobody waits for this one any more. */
  void remove(Question question) {
    waiting.removeIf(one -> one.question() == question);
  }

  /** A text was edited: who asked about it, or about its counterpart, asked about another text. */
  void edited(Path file, Collection<FilePair> pairs) {
    for (Iterator<Waiting> all = waiting.iterator(); all.hasNext(); ) {
      Question question = all.next().question();
      boolean concerned = pairs.stream().anyMatch(p -> p.has(file) && p.has(question.file()));
      if (concerned || question.file().equals(file)) {
        all.remove();
        question.reply().outdated();
      }
    }
  }

  /** Answers those that can be answered now; of a file that is not open there is nothing to say. */
  void answer(Collection<Path> open, Predicate<Path> ready, Oracle oracle) {
    for (Iterator<Waiting> all = waiting.iterator(); all.hasNext(); ) {
      Waiting one = all.next();
      Path file = one.question().file();
      if (!open.contains(file)) {
        all.remove();
        one.question().reply().answer(Answer.NONE);
      } else if (ready.test(file)) {
        all.remove();
        one.question().reply().answer(oracle.answer(file, one.offset()));
      }
    }
  }
}
