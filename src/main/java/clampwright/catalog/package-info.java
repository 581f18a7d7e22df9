/**
 * Tables of threads, heads, nuts, washers, holes, materials and strengths, read from CSV resources
 * that carry their sources. Every entry keeps its source and provenance for the reader.
 */
package clampwright.catalog;
