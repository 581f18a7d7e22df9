/**
 * The observable model, undo, and the pure arithmetic of gestures. Uses {@code javafx.base} only.
 */
package clampwright.edit;
