/** Fields for one value of the sketch each, in the reader's units. */
package clampwright.view.field;
