/** What every stage is handed: cancellation, the clock, and a trace of what ran. */
package dev.tallystick.run;
