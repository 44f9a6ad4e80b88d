package dev.tallystick.run;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.CompletableFuture;
import org.junit.jupiter.api.Test;

/** When nothing is under way. */
class ActivityTest {
  @Test
  void itIsIdleOnceAllThatBeganHasEnded() {
    Activity activity = new Activity();
    assertTrue(activity.idle().isDone());
    activity.begin();
    activity.begin();
    CompletableFuture<Void> idle = activity.idle();
    activity.end();
    assertFalse(idle.isDone());
    activity.end();
    assertTrue(idle.isDone());
    assertTrue(activity.idle().isDone());
  }
}
