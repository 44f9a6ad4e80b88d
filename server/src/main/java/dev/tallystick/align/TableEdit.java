package dev.tallystick.align;

/** Carries an edit of a text over to a table: what is new, what has moved, what may change. */
final class TableEdit {
  private final Table table;
  private final Way way;

  TableEdit(Table table) {
    this.table = table;
    this.way = table.way;
  }

  /** The texts are these now, changed in one place each at most. */
  void apply(Change inSource, Change inTarget, Sides sides) {
    Side oldSource = table.source;
    Side oldTarget = table.target;
    table.texts(sides);
    if (!inTarget.isNone()) {
      replaceRows(inTarget);
      blocks(inTarget, oldTarget, sides.target());
    }
    if (!inSource.isNone()) {
      replaceColumns(inSource, sameBlocks(inSource, oldSource, sides.source()));
    }
    table.lexis.replace(inSource, inTarget, sides, new Band(way.low, way.high));
  }

  private void replaceRows(Change change) {
    int at = change.from();
    way.replaceRows(at, change.removed(), change.added());
    if (change.shift() != 0) {
      Cells[] rows = new Cells[way.targets + 1];
      System.arraycopy(table.rows, 0, rows, 0, at + 1);
      int behind = at + 1 + change.removed();
      System.arraycopy(
          table.rows, behind, rows, at + 1 + change.added(), table.rows.length - behind);
      for (int row = at + 1; row <= at + change.added(); row++) {
        rows[row] = new Cells();
      }
      table.rows = rows;
      table.restless(at - Way.REACH, at + change.added() + Way.REACH);
    }
    int last = Math.max(at, at + change.added() - 1);
    for (int row = Math.max(0, at - Shape.MOST + 1); row <= Math.min(last, way.targets); row++) {
      table.rows[row].forgetLinks(table.down, Math.max(0, at - row));
    }
    table.dirty(at - Shape.MOST, at + change.added() + Shape.MOST);
  }

  /** Rows in which other blocks begin or end than before. */
  private void blocks(Change change, Side before, Side now) {
    int first = Math.max(0, change.from() - Table.AROUND);
    int last = Math.min(way.targets, change.from() + change.added() + Table.AROUND);
    for (int row = first; row <= last; row++) {
      int old = change.before(row);
      if (old < 0 || !now.sameBlocks(row, before, old)) {
        table.dirty(row, row);
      }
    }
  }

  private boolean sameBlocks(Change change, Side before, Side now) {
    if (change.shift() != 0) {
      return false;
    }
    int first = Math.max(0, change.from() - Table.AROUND);
    int last = Math.min(now.size(), change.from() + change.added() + Table.AROUND);
    for (int column = first; column <= last; column++) {
      if (!now.sameBlocks(column, before, column)) {
        return false;
      }
    }
    return true;
  }

  private void replaceColumns(Change change, boolean sameBlocks) {
    int at = change.from();
    int aside = sameBlocks ? Shape.MOST : Table.AROUND;
    int first = way.firstRowReaching(at - aside);
    int last = way.lastRowReaching(at + change.removed() + aside);
    while (first <= last && way.high[first] < at - aside) {
      first++;
    }
    while (first <= last && way.low[last] > at + change.removed() + aside) {
      last--;
    }
    int shift = change.shift();
    way.replaceColumns(at, change.removed(), change.added());
    for (int row = last + 1; shift != 0 && row <= way.targets; row++) {
      way.low[row] += shift;
      way.high[row] += shift;
    }
    if (first <= last) {
      table.reband(first, last, new Cells.Columns(at, change.added(), shift));
    }
    if (shift != 0) {
      table.restless(first - Way.REACH, last + Way.REACH);
    }
  }
}
