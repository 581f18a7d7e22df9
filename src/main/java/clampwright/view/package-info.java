/**
 * Panes and fields around the section: what is given, what is found, the schedule, the working.
 * Every pane lives as long as its model, so plain listeners on the model are enough here.
 */
package clampwright.view;
