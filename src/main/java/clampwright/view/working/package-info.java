/** The working: the arithmetic of the selected part or of a readout. */
package clampwright.view.working;
