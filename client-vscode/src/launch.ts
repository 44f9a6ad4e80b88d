/**
 * What `java` is called with. Whatever the virtual machine itself has to say goes to standard
 * error: a single line of it on standard output would break the conversation.
 *
 * @param jar the server's file
 * @param editor the number of this process; the server ends when it does
 */
export function serverArguments(jar: string, editor: number): string[] {
  return [
    "-XX:+UseSerialGC",
    "-Xlog:disable",
    "-Xlog:all=warning:stderr",
    "-jar",
    jar,
    "serve",
    "--stdio",
    "--clientProcessId",
    String(editor),
  ];
}
