package clampwright.view.given;

import static clampwright.view.given.AngleFields.method;
import static clampwright.view.given.AngleFields.withMethod;

import clampwright.edit.SketchModel;
import clampwright.figure.Sentences;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.Sketch;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.WasherRule;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.Reason;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone.WasherDecision;
import clampwright.quantity.Dimension;
import clampwright.view.OncePerPulse;
import clampwright.view.field.FieldRow;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;
import javafx.scene.control.Label;

/** How the joint is to be judged. */
final class MethodSection extends Section {
  private final SketchModel model;
  private final FieldRow headAngle;
  private final FieldRow nutAngle;
  private final QuantityField nutAngleField;
  private final FieldRow body;
  private final Label headWasher = why("head-washer-why");
  private final Label nutWasher = why("nut-washer-why");

  MethodSection(SketchModel model) {
    super("Method");
    this.model = model;
    add("Half-angle", Fields.choice(model, "angle-rule", AngleFields.rule(model)));
    headAngle = add("Angle", Fields.quantity(model, "head-angle", AngleFields.head()));
    nutAngleField = Fields.quantity(model, "nut-angle", AngleFields.nut());
    nutAngle = add("Angle at the nut", nutAngleField);
    add("Stiffness by", Fields.choice(model, "stiffness-method", stiffness()));
    body = add("Body Ø for VDI", Fields.quantity(model, "body-diameter", body()));
    add("Washer at head", Fields.choice(model, "head-washer-rule", headWasherRule()));
    add(headWasher);
    add("Washer at nut", Fields.choice(model, "nut-washer-rule", nutWasherRule()));
    add(nutWasher);
    FieldRow ends = add("Bolt ends", Fields.choice(model, "ends-counted", ends()));
    FieldRow area = add("Thread area", Fields.choice(model, "thread-area", threadArea()));
    fold("bolt stiffness", ends, area);
    OncePerPulse.keep(this, this::follow, model.sketchProperty(), model.assessmentProperty());
  }

  private static Label why(String id) {
    Label why = new Label();
    why.setId(id);
    why.getStyleClass().add("why");
    why.setWrapText(true);
    return why;
  }

  private void follow() {
    Sketch sketch = model.sketch();
    boolean typed = AngleFields.isTyped(sketch);
    setShown(headAngle, typed);
    setShown(nutAngle, typed);
    nutAngleField.setAutomatic(OptionalDouble.of(Math.toRadians(AngleFields.headDegrees(sketch))));
    setShown(body, method(sketch).bodyDiameter().isPresent() || isBodyAskedFor());
    if (model.assessment() instanceof Assessment.Solved solved) {
      show(headWasher, solved.zone().headWasher(), Side.HEAD);
      show(nutWasher, solved.zone().nutWasher(), Side.NUT);
    } else {
      setShown(headWasher, false);
      setShown(nutWasher, false);
    }
  }

  private void show(Label label, WasherDecision decision, Side end) {
    boolean washer = decision.taken() != WasherDecision.Taken.NO_WASHER;
    setShown(label, washer && decision.automatic());
    String sentence = Sentences.washerDecision(decision, end, model.sketch().units());
    label.setText(sentence.replaceAll("(\\d) (?=(mm|in)\\b)", "$1\u00a0"));
  }

  private boolean isBodyAskedFor() {
    if (model.assessment() instanceof Assessment.Solved solved) {
      return solved.members().get(StiffnessMethod.VDI_2230)
              instanceof MemberStiffness.NotApplicable not
          && not.why() == MemberStiffness.Why.BODY_DIAMETER_NEEDED;
    }
    return ((Assessment.Unsolved) model.assessment())
        .reasons().stream().anyMatch(MethodSection::asksForBody);
  }

  private static boolean asksForBody(Reason reason) {
    return reason.cause() == Reason.Cause.BODY_DIAMETER_NEEDED
        || reason.why().equals(Optional.of(MemberStiffness.Why.BODY_DIAMETER_NEEDED));
  }

  private static SketchNumber body() {
    return SketchNumber.optional(
        "Body diameter for VDI 2230",
        Dimension.LENGTH,
        sketch -> method(sketch).bodyDiameter(),
        (sketch, value) -> withMethod(sketch, method -> method.withBodyDiameter(value)));
  }

  private static SketchChoice<StiffnessMethod> stiffness() {
    return SketchChoice.among(
        "Stiffness method",
        sketch -> Optional.of(method(sketch).stiffness()),
        (sketch, value) -> withMethod(sketch, method -> method.withStiffness(value)),
        Sentences::shortMethod,
        List.of(StiffnessMethod.values()));
  }

  private static SketchChoice<Boolean> ends() {
    return SketchChoice.among(
        "Bolt ends",
        sketch -> Optional.of(method(sketch).endsCounted()),
        (sketch, value) -> withMethod(sketch, method -> method.withEndsCounted(value)),
        counted -> counted ? "counted" : "not counted",
        List.of(true, false));
  }

  private static SketchChoice<Method.ThreadArea> threadArea() {
    return SketchChoice.among(
        "Thread area",
        sketch -> Optional.of(method(sketch).threadArea()),
        (sketch, value) -> withMethod(sketch, method -> method.withThreadArea(value)),
        area -> area == Method.ThreadArea.STRESS_AREA ? "stress area" : "minor area",
        List.of(Method.ThreadArea.values()));
  }

  static SketchChoice<WasherRule> headWasherRule() {
    return washerRule(Side.HEAD, Joint::headWasherRule, Joint::withHeadWasherRule);
  }

  static SketchChoice<WasherRule> nutWasherRule() {
    return washerRule(Side.NUT, Joint::nutWasherRule, Joint::withNutWasherRule);
  }

  private static SketchChoice<WasherRule> washerRule(
      Side end, Function<Joint, WasherRule> read, BiFunction<Joint, WasherRule, Joint> write) {
    return SketchChoice.among(
        "Washer rule at the " + Sentences.side(end),
        sketch -> Optional.of(read.apply(sketch.joint())),
        (sketch, rule) -> sketch.withJoint(joint -> write.apply(joint, rule)),
        rule -> Sentences.washerRule(rule, end),
        List.of(WasherRule.values()));
  }
}
