/**
 * File formats. Each extractor turns a file into blocks of translatable prose, every character of
 * which is a character of the file at a known offset, and leaves the rest behind; what is copied
 * unchanged into a translation (code, tables of figures) stays as a landmark.
 */
package dev.tallystick.prose;
