/** Which number matters: sensitivity bars and a Monte-Carlo run, in the drawer. */
package clampwright.view.spread;
