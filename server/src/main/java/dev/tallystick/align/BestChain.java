package dev.tallystick.align;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Walks back through a lattice along the moves of its best chain, after Viterbi. */
final class BestChain {
  private final Lattice lattice;
  private final int sources;
  private final int targets;
  private final List<Match> backwards = new ArrayList<>();

  BestChain(Lattice lattice) {
    this.lattice = lattice;
    this.sources = lattice.source().size();
    this.targets = lattice.target().size();
  }

  /** The matches of the chain, from the start of the texts to their end. */
  List<Match> matches() {
    int row = targets;
    int column = bestEnd();
    leaveOut(row, column, sources);
    while (row > 0 || column > 0) {
      int move = lattice.row(row).move[column - lattice.row(row).first];
      int toRow = row - rowsBack(move, row);
      int toColumn = column - columnsBack(move, column);
      if (isLink(move)) {
        backwards.add(new Match(toColumn, column, toRow, row, 1));
      } else {
        leaveOut(row, toColumn, column);
        leaveUnexplained(toRow, row, column);
      }
      row = toRow;
      column = toColumn;
    }
    Collections.reverse(backwards);
    return backwards;
  }

  private int bestEnd() {
    Row end = lattice.row(targets);
    int best = end.last;
    double worth = Row.NOWHERE;
    for (int column = end.last; column >= end.first; column--) {
      double ended = end.best[column - end.first] + lattice.ending(column);
      if (ended > worth) {
        worth = ended;
        best = column;
      }
    }
    return best;
  }

  private boolean isLink(int move) {
    return move < lattice.omission();
  }

  private int rowsBack(int move, int row) {
    if (isLink(move)) {
      return lattice.down(move);
    }
    if (move == lattice.addedBlock()) {
      return row - lattice.target().blockEndingAt[row];
    }
    return move == lattice.addition() ? 1 : 0;
  }

  private int columnsBack(int move, int column) {
    if (isLink(move)) {
      return lattice.right(move);
    }
    if (move == lattice.omittedBlock()) {
      return column - lattice.source().blockEndingAt[column];
    }
    return move == lattice.omission() ? 1 : 0;
  }

  private void leaveOut(int row, int from, int to) {
    for (int unit = to; unit > from; unit--) {
      backwards.add(new Match(unit - 1, unit, row, row, 1));
    }
  }

  private void leaveUnexplained(int from, int to, int column) {
    for (int unit = to; unit > from; unit--) {
      backwards.add(new Match(column, column, unit - 1, unit, 1));
    }
  }
}
