/** What every stage is handed: cancellation, the clock, and threads. */
package dev.tallystick.run;
