package dev.tallystick.engine;

import dev.tallystick.run.Activity;
import dev.tallystick.run.Alarm;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * What the loop needs of its surroundings.
 *
 * @param disk where files are read from
 * @param alarm tells the time, and rings
 * @param activity told of all that is under way
 * @param examiner what workers do with a pair
 * @param workers how many of them there are
 * @param watch makes a watch of the disk that posts to the loop
 * @param editorWatches whether the editor watches its folders itself
 */
public record Machine(
    Disk disk,
    Alarm alarm,
    Activity activity,
    Examiner examiner,
    int workers,
    Function<Consumer<Event>, Watch> watch,
    boolean editorWatches) {
  /** This machine. */
  public static Machine real() {
    int workers = Math.max(1, Math.min(4, Runtime.getRuntime().availableProcessors() - 1));
    return new Machine(
        Disk.REAL,
        Alarm.ofMachine(),
        new Activity(),
        Examiner.ADAPTIVE,
        workers,
        FolderWatch::open,
        false);
  }

  /** The same, with an editor that watches its folders or does not. */
  public Machine watchedByEditor(boolean watches) {
    return new Machine(disk, alarm, activity, examiner, workers, watch, watches);
  }
}
