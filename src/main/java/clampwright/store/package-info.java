/**
 * Sketches on disk. A file is JSON with a format number, always in mm, N, MPa, 1/K and degrees; a
 * number reads back to the last bit. What a file holds that this program does not know is remarked
 * on, never dropped silently; what is wrong is told with its place, all of it at once. Saving
 * replaces a file as a whole or not at all.
 */
package clampwright.store;
