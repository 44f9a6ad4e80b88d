/** What helps while writing: sentences of the source, put into the translation to be translated. */
package dev.tallystick.aid;
