/** Blocks into sentences (UAX #29 with repairs), sentences into words. */
package dev.tallystick.segment;
