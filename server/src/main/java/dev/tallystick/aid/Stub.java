package dev.tallystick.aid;

import dev.tallystick.engine.PairResult;
import dev.tallystick.engine.Reading;
import dev.tallystick.prose.Block;
import dev.tallystick.prose.Format;
import dev.tallystick.text.Edit;
import dev.tallystick.text.Text;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Puts sentences of the source into the translation as they are, to be translated there.
 *
 * <p>A sentence whose neighbour in its block has a counterpart goes into the block of that one,
 * right beside it: behind what stands for the sentence before, else before what stands for the
 * sentence behind. Where the translation has put blocks together it goes between them. All others
 * become blocks of their own, with the marks and blank lines of the source. A cell of a row that
 * has a counterpart cannot be put in, nor can the head of a table, a note without its sentence, a
 * value of front matter, or a part of a cue. Of what would break the translation nothing is put in.
 */
public final class Stub {
  private final Reading source;
  private final Reading target;
  private final Places places;

  /** The source's segments that are put in, as far as known. */
  private final List<Integer> put = new ArrayList<>();

  private Stub(PairResult result) {
    this.source = result.source();
    this.target = result.target();
    this.places = new Places(result);
  }

  /**
   * What is to be changed in the translation.
   *
   * @param format of the translation
   * @param segments indices of the sentences among the segments of the source, sorted
   * @return none if they cannot be put in
   */
  public static List<LineEdit> edits(PairResult result, Format format, List<Integer> segments) {
    Stub stub = new Stub(result);
    List<LineEdit> edits = LineEdit.of(result.target().text(), stub.all(result, format, segments));
    return new Trial(result, format).holds(edits, stub.put) ? edits : List.of();
  }

  private List<Edit> all(PairResult result, Format format, List<Integer> segments) {
    String lineEnd = lineEnd();
    Inline inBlocks = new Inline(result, format, lineEnd);
    Blocks between = new Blocks(result, format, lineEnd);
    Map<Inline.Point, List<Integer>> inline = new LinkedHashMap<>();
    Map<Integer, List<Group>> blocks = new TreeMap<>();
    for (Group group : Group.of(source, segments)) {
      if (!canCome(group, format)) {
        continue;
      }
      Optional<Inline.Point> point = point(group);
      boolean comes =
          point.isPresent() || group.kind() != Block.Kind.CELL || isBodyRow(group, between);
      if (comes) {
        put.addAll(group.segments());
      }
      if (point.isPresent()) {
        inline.computeIfAbsent(point.get(), key -> new ArrayList<>()).addAll(group.segments());
      } else if (comes) {
        blocks.computeIfAbsent(places.before(group.first()), key -> new ArrayList<>()).add(group);
      }
    }
    List<Edit> edits = new ArrayList<>();
    inline.forEach((point, sentences) -> edits.add(inBlocks.edit(point, sentences)));
    blocks.forEach((segment, groups) -> edits.add(between.edit(segment, groups)));
    return edits;
  }

  /**
   * Whether sentences can be taken along: not out of front matter, nor a note without the sentence
   * that it stands in, nor of subtitles anything but whole cues, and what goes on in a cue that is
   * there.
   */
  private boolean canCome(Group group, Format format) {
    if (group.kind() == Block.Kind.METADATA || group.isInside()) {
      return false;
    }
    if (!format.hasCues() || point(group).isEmpty() && group.hasWholeCues()) {
      return true;
    }
    return group.isInCueBefore() && places.inPlace(group.first() - 1);
  }

  private boolean isBodyRow(Group group, Blocks between) {
    return group.isWhole() && !between.wouldBehead(places.before(group.first()));
  }

  /** Where sentences go into a block that is there. */
  private Optional<Inline.Point> point(Group group) {
    int left = group.first() - 1;
    if (group.hasInBlock(left) && places.inPlace(left)) {
      int behind = places.before(group.first());
      boolean near = behind > places.last(left) && together(behind, places.last(left));
      return Optional.of(new Inline.Point(near ? behind : places.last(left), true));
    }
    int right = group.last() + 1;
    if (group.hasInBlock(right) && places.inPlace(right)) {
      return Optional.of(new Inline.Point(places.first(right), false));
    }
    int before = places.before(group.first());
    boolean prose = group.kind() == Block.Kind.PARAGRAPH || group.kind() == Block.Kind.QUOTATION;
    return prose && before >= 0 && together(before, before + 1)
        ? Optional.of(new Inline.Point(before, true))
        : Optional.empty();
  }

  /** Whether two target segments stand in one block. */
  private boolean together(int one, int other) {
    return other < target.segments().size()
        && target.segments().get(one).block().equals(target.segments().get(other).block());
  }

  /** How lines end in the translation; in the source, if it has one line only. */
  private String lineEnd() {
    return lineEnd(target.text()).or(() -> lineEnd(source.text())).orElse("\n");
  }

  private static Optional<String> lineEnd(Text text) {
    return text.lines() == 1
        ? Optional.empty()
        : Optional.of(text.string().substring(text.lineEnd(0), text.lineStart(1)));
  }
}
