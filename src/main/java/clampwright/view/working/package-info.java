/** The arithmetic of whatever is selected. */
package clampwright.view.working;
