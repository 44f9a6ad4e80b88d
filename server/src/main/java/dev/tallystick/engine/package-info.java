/**
 * The pipeline from text to findings, the last result of each pair, and the loop that keeps both up
 * to date: one thread that alone changes state, and a pool of workers that see snapshots only.
 */
package dev.tallystick.engine;
