/** Benchmarks. None is a test: speed is compared within one run, by eye. */
package dev.tallystick.bench;
