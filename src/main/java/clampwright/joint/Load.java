package clampwright.joint;

/**
 * The outside load on one bolt.
 *
 * @param axial [N]; positive pulls the joint apart
 * @param introduction load-introduction factor n [–], 0 … 1; 1 = under head and nut
 */
public record Load(double axial, double introduction) {
  public Load {
    Check.finite("axial load", "N", axial);
    Check.between("load-introduction factor", 0, introduction, 1);
  }

  public Load withAxial(double axial) {
    return new Load(axial, introduction);
  }

  public Load withIntroduction(double introduction) {
    return new Load(axial, introduction);
  }
}
