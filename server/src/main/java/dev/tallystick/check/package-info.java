/**
 * What is worth telling the translator: matches and sentences in, findings and the progress of a
 * translation out, with the words for each code.
 */
package dev.tallystick.check;
