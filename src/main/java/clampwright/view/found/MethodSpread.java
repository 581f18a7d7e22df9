package clampwright.view.found;

import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import javafx.scene.layout.Region;

/** The load factor by every method as dots on one axis. */
final class MethodSpread extends Region {
  static final double HEIGHT = 58;

  private MemberStiffness members;
  private StiffnessMethod chosen;

  MethodSpread() {
    getStyleClass().add("method-spread");
    setMinHeight(HEIGHT);
    setPrefHeight(HEIGHT);
  }

  void show(MemberStiffness members, StiffnessMethod chosen) {
    this.members = members;
    this.chosen = chosen;
    requestLayout();
  }
}
