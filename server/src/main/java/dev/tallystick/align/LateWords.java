package dev.tallystick.align;

/** The words that stand in both texts, gathered once somebody asks. */
final class LateWords implements LinkWords {
  private final Sides sides;
  private SharedWords words;

  LateWords(Sides sides) {
    this.sides = sides;
  }

  @Override
  public double worth(int s, int sEnd, int t, int tEnd) {
    return words().worth(s, sEnd, t, tEnd);
  }

  @Override
  public double alike(int s, int t) {
    return words().alike(s, t);
  }

  private SharedWords words() {
    if (words == null) {
      words = new SharedWords(sides.source(), sides.target());
    }
    return words;
  }
}
