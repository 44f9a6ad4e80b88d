package dev.tallystick.lsp;

import dev.tallystick.align.Judgement;
import dev.tallystick.engine.Disk;
import dev.tallystick.engine.Event;
import dev.tallystick.engine.Examiner;
import dev.tallystick.engine.Folder;
import dev.tallystick.engine.Machine;
import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.engine.Unreadable;
import dev.tallystick.engine.Watch;
import dev.tallystick.run.Activity;
import dev.tallystick.run.Cancellation;
import dev.tallystick.run.HandAlarm;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;

/**
 * A machine with a clock moved by hand, workers that can be held up, and a watch that can be told.
 */
final class Surround {
  static final int WORKERS = 2;

  final HandAlarm alarm = new HandAlarm();
  final Activity activity = new Activity();

  /** What workers do; a test may put something else here. */
  volatile Examiner examiner = Examiner.ADAPTIVE;

  /** What files are read from; a test may put something else here. */
  volatile Disk disk = Disk.REAL;

  /** The folders that the server wants to watch itself. */
  volatile List<Folder> watched = List.of();

  private volatile CountDownLatch gate = new CountDownLatch(0);
  private volatile CountDownLatch listing = new CountDownLatch(0);
  private volatile Consumer<Event> post;

  Machine machine() {
    return new Machine(new HeldDisk(), alarm, activity, this::examine, WORKERS, this::watch, false);
  }

  /** From now on workers wait before they examine. */
  void hold() {
    gate = new CountDownLatch(1);
  }

  /** From now on workers wait before they list a folder. */
  void holdListing() {
    listing = new CountDownLatch(1);
  }

  void release() {
    gate.countDown();
    listing.countDown();
  }

  /** How often a folder was listed. */
  final AtomicInteger listings = new AtomicInteger();

  private static void await(CountDownLatch latch) {
    try {
      latch.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  /** This machine's disk, but its listings can be held up. */
  private final class HeldDisk implements Disk {
    @Override
    public byte[] read(Path file) throws Unreadable {
      return disk.read(file);
    }

    @Override
    public List<Path> files(Path folder) throws Unreadable {
      await(listing);
      return disk.files(folder);
    }

    @Override
    public List<Path> files(Folder folder, Consumer<String> unread) throws Unreadable {
      await(listing);
      listings.incrementAndGet();
      return disk.files(folder, unread);
    }
  }

  /** The watch tells something. */
  void tell(Event event) {
    post.accept(event);
  }

  private PairResult examine(
      Reading source,
      Reading target,
      boolean draft,
      Optional<Judgement> known,
      Cancellation cancellation) {
    await(gate);
    cancellation.check();
    return examiner.examine(source, target, draft, known, cancellation);
  }

  private Watch watch(Consumer<Event> to) {
    post = to;
    return new Watch() {
      @Override
      public void over(List<Folder> folders) {
        watched = folders;
      }

      @Override
      public void close() {
        watched = List.of();
      }
    };
  }
}
