import assert from "node:assert/strict";
import { test } from "node:test";
import { noJava } from "../src/words";

test("no Java anywhere: what to do, and where it was looked for", () => {
  assert.equal(
    noJava([{ origin: "PATH", where: "java", reason: { kind: "absent" } }]),
    "Tallystick needs Java 17 or newer and found none. Install one, or name yours in the setting" +
      " tallystick.java. Looked at PATH: no java in it.",
  );
});

test("each place that was tried says why it will not do", () => {
  assert.equal(
    noJava([
      { origin: "JAVA_HOME", where: "/jdk/bin/java", reason: { kind: "absent" } },
      { origin: "PATH", where: "/a/java", reason: { kind: "old", version: 11 } },
      { origin: "PATH", where: "/b/java", reason: { kind: "mute" } },
    ]),
    "Tallystick needs Java 17 or newer and found none. Install one, or name yours in the setting" +
      " tallystick.java. Looked at JAVA_HOME: there is no file /jdk/bin/java; PATH: /a/java is" +
      " Java 11; PATH: /b/java does not tell its version.",
  );
});

test("a wrong setting is the setting's matter alone", () => {
  assert.equal(
    noJava([
      {
        origin: "tallystick.java",
        where: "/jdk/bin/java",
        reason: { kind: "broken", fault: "EACCES" },
      },
    ]),
    "Tallystick needs Java 17 or newer, and the setting tallystick.java does not lead to one:" +
      " /jdk/bin/java cannot be run (EACCES). Set it to the full path of the program java or of" +
      " the folder that Java is installed in, or clear it.",
  );
});

test("a relative path is told as such", () => {
  const said = noJava([{ origin: "tallystick.java", where: "jdk", reason: { kind: "relative" } }]);
  assert.match(said, /: jdk is not a full path\. Set it/);
});
