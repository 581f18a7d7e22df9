/** Sketches on disk. */
package clampwright.store;
