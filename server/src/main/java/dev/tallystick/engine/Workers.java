package dev.tallystick.engine;

import dev.tallystick.run.Activity;
import dev.tallystick.run.Cancellation;
import dev.tallystick.run.Fault;
import dev.tallystick.run.Threads;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Consumer;
import java.util.function.Supplier;

/**
 * A few threads that examine pairs and list folders. What they find comes back as an event. Pairs
 * that nobody looks at have threads of their own, so that none that is open waits behind them.
 */
final class Workers {
  private final ExecutorService pool;
  private final ExecutorService aside;
  private final Machine machine;
  private final Consumer<Event> post;

  Workers(Machine machine, Consumer<Event> post) {
    this.machine = machine;
    this.post = post;
    this.pool =
        Executors.newFixedThreadPool(machine.workers(), Threads.daemons("tallystick-worker"));
    this.aside =
        Executors.newFixedThreadPool(machine.workers(), Threads.daemons("tallystick-aside"));
  }

  /**
   * Examines a pair.
   *
   * @param open whether the editor shows a side of it, or somebody waits for it
   */
  void examine(Task task, boolean open) {
    run(open ? pool : aside, () -> examined(task));
  }

  /** Learns from the texts of a pair of which there is a result already. Nobody waits for it. */
  void learn(Task task) {
    run(aside, () -> examined(task));
  }

  /** How many pairs that are not open can be examined at once. */
  int aside() {
    return machine.workers();
  }

  void list(Folder folder) {
    run(pool, () -> listed(folder));
  }

  void stop() {
    pool.shutdownNow();
    aside.shutdownNow();
  }

  private void run(ExecutorService by, Supplier<Event> work) {
    Activity activity = machine.activity();
    activity.begin();
    by.execute(
        () -> {
          try {
            post.accept(work.get());
          } finally {
            activity.end();
          }
        });
  }

  /**
   * The only place where a cancelled computation ends, and where a fault of our own does. Whatever
   * happens there is an event: a pair that none came for would never be settled.
   */
  private Event examined(Task task) {
    try {
      task.check();
      PairResult result =
          machine
              .examiner()
              .examine(
                  task.source().reading(),
                  task.target().reading(),
                  task.draft(),
                  task.known(),
                  task);
      return new Event.Examined(task, Optional.of(result), Optional.empty());
    } catch (Cancellation.Cancelled e) {
      return new Event.Examined(task, Optional.empty(), Optional.empty());
    } catch (RuntimeException | Error e) {
      return new Event.Examined(task, Optional.empty(), Optional.of(Fault.where(e)));
    }
  }

  private Event listed(Folder folder) {
    List<String> troubles = new ArrayList<>();
    try {
      List<Path> files = machine.disk().files(folder, troubles::add);
      return new Event.Listed(folder.path(), files, troubles);
    } catch (Unreadable e) {
      return new Event.Listed(folder.path(), List.of(), List.of(e.getMessage()));
    } catch (RuntimeException | Error e) {
      String fault = Announcements.fault(folder, Fault.where(e));
      return new Event.Listed(folder.path(), List.of(), List.of(fault));
    }
  }
}
