package clampwright.view.given;

import clampwright.joint.Joint;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The sentence that says what the preload would be if it were given otherwise. */
final class PreloadForms {
  private PreloadForms() {}

  /** Such as "= 22.0 kN · 61 % of proof · 44.0 N·m at K 0.20". */
  static String text(Sketch sketch) {
    Joint joint = sketch.joint();
    Target target = joint.tightening().target();
    UnitSystem units = sketch.units();
    boolean share = target instanceof Target.ProofFraction;
    if (share && TargetForms.shareOfProof(joint).isEmpty()) {
      return "This strength class has no proof strength.";
    }
    List<String> forms = new ArrayList<>();
    if (!(target instanceof Target.Force)) {
      forms.add(Quantities.text(Dimension.FORCE, units, TargetForms.preload(joint)));
    }
    if (!share) {
      TargetForms.shareOfProof(joint)
          .ifPresent(
              value -> forms.add(Quantities.text(Dimension.SHARE, units, value) + " of proof"));
    }
    if (target instanceof Target.FrictionTorque) {
      forms.add(nutFactor(joint));
    } else if (!(target instanceof Target.NutFactorTorque)) {
      forms.add(
          Quantities.text(Dimension.TORQUE, units, TargetForms.torque(joint))
              + " at "
              + nutFactor(joint));
    }
    return "= " + String.join(" · ", forms.stream().map(PreloadForms::unbroken).toList());
  }

  private static String nutFactor(Joint joint) {
    return String.format(Locale.ROOT, "K %.2f", TargetForms.nutFactor(joint));
  }

  /** A line may break between the forms only. */
  private static String unbroken(String form) {
    return form.replace(' ', '\u00a0');
  }
}
