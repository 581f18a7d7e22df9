/** Checks of strength and function: pure functions of a joint and what it comes to. */
package clampwright.mechanics.checks;
