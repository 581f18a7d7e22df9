/** The cross-section on the screen and the gestures by which it is drawn. */
package clampwright.view.section;
