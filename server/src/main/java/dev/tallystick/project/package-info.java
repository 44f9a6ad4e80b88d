/**
 * The facts of a project: what its {@code tallystick.json} says, and what is wrong in it. It opens
 * no file.
 */
package dev.tallystick.project;
