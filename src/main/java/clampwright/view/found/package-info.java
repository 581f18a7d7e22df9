/** What is found: readouts, the spread over methods, cautions, or why there is no solution. */
package clampwright.view.found;
