/**
 * Which file belongs to which, in which language: a pure function on paths and settings. It opens
 * no file.
 */
package dev.tallystick.pairing;
