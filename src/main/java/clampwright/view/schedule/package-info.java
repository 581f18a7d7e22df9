/** The schedule: the stack as a table, one row per element, the selected one marked. */
package clampwright.view.schedule;
