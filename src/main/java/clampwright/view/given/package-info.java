/** What is given: the inputs of the sketch as fields, in the order of a calculation sheet. */
package clampwright.view.given;
