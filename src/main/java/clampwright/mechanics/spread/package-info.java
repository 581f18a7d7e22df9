/** Which number matters: inputs that stray, alone and together. */
package clampwright.mechanics.spread;
