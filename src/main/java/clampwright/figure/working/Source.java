package clampwright.figure.working;

/** Where the formulas of a working come from. */
final class Source {
  static final String GEOMETRY = "geometry";
  static final String PRACTICE = "common practice, no source";
  static final String TYPED = "as typed";
  static final String CHOSEN = "as chosen";
  static final String ELASTIC_BAR = "elastic bar, Hooke's law";
  static final String SERIES = "springs in series";
  static final String CONES = "straight cones at one half-angle; common practice, no source";
  static final String FRUSTUM = "Shigley eq. 8-19";
  static final String QUADRATURE = "Gauss–Legendre quadrature, 24 points";
  static final String EFFECTIVE_GRIP = "Shigley, effective grip of a tapped joint";
  static final String VDI = "VDI 2230-1, from memory";
  static final String WILEMAN = "Wileman, Choudhury, Green 1991; constants partly from memory";
  static final String SHARING = "Shigley ch. 8; n as in VDI 2230-1, from memory";
  static final String TORQUE = "ISO 16047, VDI 2230-1, from memory";
  static final String NUT_FACTOR = "Shigley eq. 8-27";
  static final String EMBEDDING = "VDI 2230-1 table 5, from memory";
  static final String RELAXATION = "NASA-STD-5020B, from memory";
  static final String EXPANSION = "free expansion against springs in series";
  static final String EQUILIBRIUM = "equilibrium";

  private Source() {}
}
