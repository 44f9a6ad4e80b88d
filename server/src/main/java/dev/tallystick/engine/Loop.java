package dev.tallystick.engine;

import dev.tallystick.run.Fault;
import dev.tallystick.run.Threads;
import dev.tallystick.text.Text;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;

/**
 * Keeps what is shown in step with what is written.
 *
 * <p><b>One queue, one thread.</b> Whatever happens is an {@link Event}: the reader of the
 * protocol, the workers, the alarm and the watch of the disk put events into one queue and do
 * nothing else. One thread takes them out, one after the other, and it alone changes the state
 * below. So nothing is locked, and the order of the queue is the order of the world: a question
 * that comes behind an edit sees the text after that edit, and none that comes later.
 *
 * <p><b>A turn</b> handles one event in two steps. First the event changes what is known: a text, a
 * folder, a setting, a result. Then {@link #settle()} brings everything else in line, whatever the
 * event was: which pairs are wanted, which of them need a worker, what is to be shown, who can be
 * answered. That step is written as if nothing were known of the event, so there is one place only
 * where a consequence can be forgotten. Only of the two kinds that come most often, the edit of an
 * open text and what passes between the loop and those who ask or work, it is known which pairs
 * they can stir; with thousands of pairs in a folder nobody would wait for a look at all of them.
 *
 * <p><b>Workers see snapshots.</b> A {@link Task} holds one state of both texts. When a text moves
 * on, its {@link Sheet} is outdated and the worker leaves at its next check; a result that comes
 * nevertheless is told by its task and dropped. A pair is settled when its result is for the
 * current texts. Only then is anything published for its files, and only then is a question about
 * them answered; until then the question waits here, in no thread. If its text is edited meanwhile
 * it never will be answered, and is told so.
 *
 * <p><b>Faults stay where they are.</b> A pair that our own code fails on shows nothing and is
 * tried again with the next text. An edit that a text cannot have makes the document lost, and the
 * user is told once. Files are read on this thread; folders, which take longer, are listed by
 * workers.
 */
public final class Loop implements AutoCloseable {
  private final BlockingQueue<Event> queue = new LinkedBlockingQueue<>();
  private final Machine machine;
  private final Audience audience;
  private final Workers workers;
  private final Watch watch;
  private final Thread thread;

  private final Library library;
  private final Caret caret;
  private final Bell bell;
  private final PairStates pairs = new PairStates();
  private final Questions questions = new Questions();
  private final Bulletin bulletin;
  private final Display display;
  private final Pass pass;
  private final Standings standings;
  private boolean started;
  private boolean set;
  private boolean inLine;
  private long turn;

  /** Sets up the loop; nothing runs before {@link #start()}. */
  public Loop(Machine machine, Audience audience) {
    this.machine = machine;
    this.audience = audience;
    this.workers = new Workers(machine, this::post);
    this.watch = machine.watch().apply(this::post);
    DiskTexts disk = new DiskTexts(machine.disk(), machine.alarm(), audience::log);
    this.library = new Library(new Shelf(disk), workers, watch, machine.editorWatches());
    this.caret = new Caret(machine.alarm());
    this.bell = new Bell(machine.alarm(), () -> post(new Event.TimerDue()));
    this.bulletin = new Bulletin(audience);
    this.display = new Display(library, pairs, bulletin);
    this.pass = new Pass(audience);
    this.standings = new Standings(audience, bulletin);
    this.thread = Threads.daemons("tallystick-loop").newThread(this::run);
  }

  /** Starts the loop's thread. */
  public void start() {
    thread.start();
  }

  /** Something has happened. Returns at once; any thread may call it. */
  public void post(Event event) {
    machine.activity().begin();
    queue.add(event);
  }

  @Override
  public void close() {
    thread.interrupt();
    workers.stop();
    watch.close();
  }

  private void run() {
    try {
      while (true) {
        turn(queue.take());
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt(); // closed
    }
  }

  private void turn(Event event) {
    turn++;
    try {
      Optional<Set<Path>> concerned = inLine ? concerned(event) : Optional.empty();
      inLine = false;
      handle(event);
      settle(concerned);
    } catch (RuntimeException | Error e) { // without this thread the server would be deaf
      audience.log("A fault of Tallystick itself: " + Fault.where(e));
    } finally {
      machine.activity().end();
    }
  }

  /** The only files that an event can change something in at once; empty if it may be any. */
  private Optional<Set<Path>> concerned(Event event) {
    if (event instanceof Event.Edited edited && library.isText(edited.file())) {
      Set<Path> files = new TreeSet<>(Set.of(edited.file()));
      caret.last().ifPresent(before -> files.add(before.file()));
      return Optional.of(files);
    }
    boolean passing =
        event instanceof Event.Examined
            || event instanceof Event.Asked
            || event instanceof Event.Withdrawn;
    return passing ? Optional.of(Set.of()) : Optional.empty();
  }

  private void handle(Event event) {
    if (event instanceof Event.Edited edited) {
      edit(edited);
    } else if (event instanceof Event.Asked asked) {
      questions.add(asked.question(), library.document(asked.question().file()));
    } else if (event instanceof Event.Withdrawn withdrawn) {
      questions.remove(withdrawn.question());
    } else if (event instanceof Event.Examined examined) {
      finish(examined);
    } else if (event instanceof Event.TimerDue) {
      bell.rung();
      caret.settle();
      library.settle(caret.restMillis());
    } else if (event instanceof Event.Saved) {
      caret.lift();
    } else if (event instanceof Event.Opened opened) {
      bulletin.name(opened.file(), opened.uri());
      library.open(
          opened.file(), Document.opened(opened.language(), opened.version(), opened.text()));
    } else if (event instanceof Event.Closed closed) {
      library.close(closed.file());
      caret.closed(closed.file());
    } else {
      handleAround(event);
    }
  }

  /** The rarer events: those around the texts. */
  private void handleAround(Event event) {
    if (event instanceof Event.FilesChanged changed) {
      library.reread(changed);
    } else if (event instanceof Event.Listed listed) {
      library.listed(listed).forEach(audience::log);
    } else if (event instanceof Event.FoldersChanged changed) {
      library.change(changed);
    } else if (event instanceof Event.Renamed renamed) {
      library.rename(renamed.renaming());
      pairs.rename(renamed.renaming());
    } else if (event instanceof Event.Begun) {
      started = true;
    } else if (event instanceof Event.SettingsChanged changed) {
      started = true;
      set = true;
      library.rules(changed.settings());
      caret.rest(changed.settings().restMillis());
    } else {
      handleCommand(event);
    }
  }

  /** What the user wants done. */
  private void handleCommand(Event event) {
    if (event instanceof Event.Paired paired) {
      library.pair(paired).map(Announcements::unreadable).ifPresent(audience::say);
    } else if (event instanceof Event.Marked marked) {
      pairs.mark(marked);
    } else if (event instanceof Event.FolderWanted wanted) {
      library.want(wanted.folder());
    } else if (event instanceof Event.FoldersDeclined) {
      library.decline();
      questions.decline();
    }
  }

  private void edit(Event.Edited edited) {
    Path file = edited.file();
    if (library.document(file).isEmpty()) {
      bulletin.name(file, edited.uri());
      library.open(file, Document.unknown());
    }
    Document document = library.document(file).orElseThrow();
    OptionalInt end = document.edit(edited.version(), edited.changes());
    questions.edited(file, pairs.pairs());
    if (document.announcesLoss()) {
      audience.say(Announcements.lost(file));
    }
    end.ifPresent(offset -> write(file, offset));
  }

  /** The translator has written something that ends at an offset. */
  private void write(Path file, int offset) {
    caret.edited(file, offset);
    pairs.edited(file, turn);
  }

  private void finish(Event.Examined examined) {
    pairs.finish(examined);
    FilePair files = examined.task().files();
    examined.fault().ifPresent(fault -> audience.log(Announcements.fault(files, fault)));
  }

  /**
   * Brings everything in line with what is known now.
   *
   * @param files all that something has changed in; empty if it may be any
   */
  private void settle(Optional<Set<Path>> files) {
    if (!started) {
      return;
    }
    Optional<Set<Path>> concerned = files;
    if (pairs.keep(library.pairs())) {
      library.retain(pairs.files());
      standings.retain(pairs.pairs());
      concerned = Optional.empty();
    }
    concerned.ifPresentOrElse(pairs::stir, pairs::stirAll);
    pairs.applyMarks(library, file -> audience.say(Announcements.alone(file)));
    pairs.take(library, workers, questions.awaited(pairs.pairs()), caret.last());
    pass.left(pairs.unsettledAside(library));
    pairs.show(caret.last());
    concerned.ifPresentOrElse(display::updateOnly, display::update);
    standings.tell(pairs.stirred());
    pairs.calm();
    questions.answer(library.open(), this::ready, this::answer);
    caret.due().ifPresent(bell::at);
    library.due(caret.restMillis()).ifPresent(bell::at);
    if (set && concerned.isEmpty()) {
      library.questions().forEach(question -> audience.say(Announcements.choice(question)));
    }
    audience.turned();
    inLine = true;
  }

  /** Whether a question can be answered. */
  private boolean ready(Question question) {
    boolean listed = question.aboutText() ? library.listed(question.file()) : library.complete();
    return listed && pairs.of(question).allMatch(PairState::settled);
  }

  private Known answer(Question question, Text text) {
    List<Settled> known = pairs.of(question).flatMap(pair -> pair.known().stream()).toList();
    return new Known(question.file(), text, known, bulletin, library::version);
  }
}
