package dev.tallystick.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import dev.tallystick.text.Span;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** How loudly findings are said. */
class LevelsTest {
  private static final List<Finding> FINDINGS =
      List.of(finding(Code.OMISSION), finding(Code.LENGTH), finding(Code.ORDER));

  private static Finding finding(Code code) {
    return new Finding(code, OnSide.TARGET, new Span(3, 9), new Span(0, 0), 0.9, "said", "there");
  }

  private static String print(List<Finding> findings) {
    StringBuilder out = new StringBuilder();
    findings.forEach(one -> out.append(one.code().word() + " " + one.severity().word() + ", "));
    return out.toString();
  }

  @Test
  void aFindingThatIsMoreQuietThanItsCodeStaysSo() {
    List<Finding> note = List.of(finding(Code.ADDITION).at(Severity.HINT));
    Levels other = new Levels(Map.of(Code.LENGTH, Optional.empty()));
    assertEquals("addition hint, ", print(other.apply(note)));
    Levels same = new Levels(Map.of(Code.ADDITION, Optional.of(Severity.WARNING)));
    assertEquals("addition warning, ", print(same.apply(note)));
  }

  @Test
  void withoutAProjectEachCodeHasItsOwnLevel() {
    assertSame(FINDINGS, Levels.USUAL.apply(FINDINGS));
    assertEquals("omission warning, length information, order information, ", print(FINDINGS));
  }

  @Test
  void aCodeCanBeLouderQuieterOrOff() {
    Levels levels =
        new Levels(
            Map.of(
                Code.OMISSION, Optional.of(Severity.HINT),
                Code.LENGTH, Optional.of(Severity.WARNING),
                Code.ORDER, Optional.empty()));
    assertEquals("omission hint, length warning, ", print(levels.apply(FINDINGS)));
    assertEquals(Optional.of(Severity.WARNING), levels.of(Code.ADDITION));
  }

  @Test
  void nothingButTheLevelChanges() {
    Levels levels = new Levels(Map.of(Code.LENGTH, Optional.of(Severity.WARNING)));
    Finding louder = levels.apply(List.of(finding(Code.LENGTH))).get(0);
    assertEquals(finding(Code.LENGTH), louder.at(Severity.INFORMATION));
  }

  @Test
  void levelsHaveNames() {
    for (Severity severity : Severity.values()) {
      assertEquals(Optional.of(severity), Severity.of(severity.word()));
    }
    assertEquals(Optional.empty(), Severity.of("error"));
  }
}
