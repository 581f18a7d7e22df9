/**
 * The arithmetic behind a result, laid out as data: label, formula, numbers put in, result, source,
 * step by step, in the reader's units.
 *
 * <p>Texts follow one notation. An underscore sets the letters up to the next sign or space low:
 * k_m. Numbers put in are an expression that a pocket calculator can follow, with × / + − ² √ π and
 * the functions tan, ln, exp, acos, min, max.
 */
package clampwright.figure.working;
