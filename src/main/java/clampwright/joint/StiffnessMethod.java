package clampwright.joint;

/** The ways to get the members' stiffness. */
public enum StiffnessMethod {
  /** One cylinder per element, as wide as the zone at its mid-plane. */
  MID_PLANE_CYLINDERS,
  /** The exact integral over the pressure zone. */
  FULL_FRUSTA,
  /** Full frusta at the angle of VDI 2230-1. */
  VDI_2230,
  /** The exponential fit of Wileman, Choudhury, Green (1991). */
  WILEMAN
}
