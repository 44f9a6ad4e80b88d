import assert from "node:assert/strict";
import { test } from "node:test";
import { Restarts } from "../src/restarts";

const MINUTE = 60_000;

/** Whether the server is started again after crashes at these times. */
function verdicts(...minutes: number[]): boolean[] {
  let now = 0;
  const restarts = new Restarts(() => now);
  return minutes.map((minute) => {
    now = minute * MINUTE;
    return restarts.again();
  });
}

test("four crashes in three minutes are forgiven, the fifth is not", () => {
  assert.deepEqual(verdicts(0, 0.1, 0.2, 0.3, 0.4), [true, true, true, true, false]);
});

test("crashes of long ago are forgotten", () => {
  assert.deepEqual(verdicts(0, 1, 2, 2.5, 3, 4), [true, true, true, true, true, true]);
});

test("a server that goes on crashing stays down", () => {
  assert.deepEqual(verdicts(0, 0, 0, 0, 0, 0), [true, true, true, true, false, false]);
});
