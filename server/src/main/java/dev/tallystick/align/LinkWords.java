package dev.tallystick.align;

/** What the words of both sides say of a link. */
interface LinkWords extends UnitWords {
  /** How much likelier the words of the two sides make each other (nats). */
  double worth(int s, int sEnd, int t, int tEnd);
}
