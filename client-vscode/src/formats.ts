/** The extensions of the files that the server reads, as README.md lists them. */
export const EXTENSIONS = [
  "txt",
  "text",
  "md",
  "markdown",
  "mkd",
  "mdx",
  "adoc",
  "asciidoc",
  "asc",
  "rst",
  "rest",
  "srt",
  "vtt",
  "html",
  "htm",
  "xhtml",
  "xml",
  "dbk",
  "docbook",
  "dita",
  "ditamap",
  "tex",
  "ltx",
] as const;

/** The languages of texts that have no file yet. */
const LANGUAGES = [
  "asciidoc",
  "dita",
  "docbook",
  "html",
  "latex",
  "markdown",
  "mdx",
  "plaintex",
  "plaintext",
  "restructuredtext",
  "rst",
  "srt",
  "subrip",
  "tex",
  "vtt",
  "webvtt",
  "xml",
] as const;

/** The settings of a project. */
export const PROJECT_FILE = "tallystick.json";

/** A kind of document that concerns the server. */
export interface Filter {
  readonly scheme: string;
  readonly pattern?: string;
  readonly language?: string;
}

/** All files that the server reads, as a glob pattern; extensions in any case. */
export const TEXTS = `**/*.{${EXTENSIONS.map(anyCase).join(",")}}`;

/** Texts that can be sources or translations. */
export const TEXT_FILTERS: readonly Filter[] = [
  { scheme: "file", pattern: TEXTS },
  ...LANGUAGES.map((language) => ({ scheme: "untitled", language })),
];

/** All that the server is told of. */
export const FILTERS: readonly Filter[] = [
  ...TEXT_FILTERS,
  { scheme: "file", pattern: `**/${PROJECT_FILE}` },
];

function anyCase(extension: string): string {
  return Array.from(extension, (letter) => `[${letter}${letter.toUpperCase()}]`).join("");
}
