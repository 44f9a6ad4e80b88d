/** The command line: commands, output for people and for programs, exit codes. */
package dev.tallystick.cli;
