/** The joint diagram in the drawer. */
package clampwright.view.diagram;
