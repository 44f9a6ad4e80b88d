/** Something that a file can be paired with. */
export interface Choice {
  /** The path as shown, with slashes; or the title of a text that has no file. */
  readonly label: string;
  readonly uri: string;
}

/**
 * Puts the likeliest partners of a file first: those of the same name in another folder, then those
 * whose names begin alike (up to the first dot, hyphen or underscore), then all others. The file
 * itself is left out, and so is what comes twice.
 */
export function byLikeness(own: Choice, others: readonly Choice[]): Choice[] {
  const once = new Map(others.map((choice) => [choice.uri, choice]));
  once.delete(own.uri);
  return [...once.values()].sort(
    (a, b) => distance(own, a) - distance(own, b) || compare(a.label, b.label),
  );
}

function distance(own: Choice, other: Choice): number {
  if (name(own) === name(other)) {
    return 0;
  }
  return stem(own) === stem(other) ? 1 : 2;
}

function name({ label }: Choice): string {
  return label.slice(label.lastIndexOf("/") + 1).toLowerCase();
}

function stem(choice: Choice): string {
  return name(choice)
    .split(/[.\-_]/, 1)
    .join("");
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
