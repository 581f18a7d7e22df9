/** Units, and numbers as a person reads and types them. The calculation never sees this package. */
package clampwright.quantity;
