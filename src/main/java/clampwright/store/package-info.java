/**
 * Sketches on disk. A file is JSON with a format number, always in mm, N, MPa, 1/K and degrees; a
 * number reads back to the last bit. What a file holds that this program does not know is remarked
 * on, never dropped silently; what is wrong is told with its place, all of it at once. Saving
 * replaces a file as a whole or not at all.
 *
 * <p>A picture can carry such a text with a check sum beside it: a PNG in a text chunk, an SVG in
 * its metadata, a PDF as an attached file. Reading one back opens the very sketch that was put in
 * or says why not, within a bounded memory, whatever the bytes.
 */
package clampwright.store;
