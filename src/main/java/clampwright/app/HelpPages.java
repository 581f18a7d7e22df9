package clampwright.app;

import clampwright.figure.Sentences;
import clampwright.view.MathText;
import clampwright.view.section.SectionPane;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;

/** The pages of the help menu. */
final class HelpPages {
  private HelpPages() {}

  /** What is computed, and where it ends. */
  static Node method() {
    return text(
        heading("The pressure zone"),
        paragraph(
            "From each clamp face a cone opens at the half-angle. A round edge holds it; behind a"
                + " narrow part it starts again from that edge. Straight edges cut its area but do"
                + " not hold it: behind them it is not reduced, which is unconservative and is said"
                + " where it happens. The zone at any depth is the smaller of the two cones; the"
                + " face it belongs to governs there."),
        heading("Member stiffness"),
        paragraph(
            "Mid-plane cylinders: one cylinder per part, as wide as the zone at its mid-plane (the"
                + " practitioner's effective diameter). Full frusta: the exact integral over the"
                + " zone (Shigley eq. 8-19). VDI 2230: full frusta at the angle it computes from"
                + " the proportions. Wileman, Choudhury, Green 1991: an exponential fit, for one"
                + " material without edges. Formulas of VDI 2230 and Wileman are quoted from"
                + " memory."),
        heading("Bolt stiffness and load"),
        paragraph(
            "The bolt is springs in series: head, shank, thread in the grip, engaged thread, nut"
                + " or tapped thread. Φ = n·k_b/(k_b + k_m); the bolt carries F_p + Φ·F_A until"
                + " the joint parts at F_p/(1 − Φ), then all of F_A."),
        heading("Washers"),
        paragraph(
            "A washer that overhangs the face by no more than t·tan α acts whole: the zone begins"
                + " at its inner side with its outside diameter (common practice, no source)."
                + " Otherwise the cone starts at the head's edge and fans through it. Either can"
                + " be set per side."),
        heading("Preload"),
        paragraph(
            "A force, a share of the proof load, or a torque, F = T/(K·d) or by the friction in"
                + " thread and face (ISO 16047). Scatter to both sides; settling takes"
                + " f_Z·k_b·k_m/(k_b + k_m), relaxation and creep a share of the least preload."
                + " A temperature case changes it by the difference of free expansions times the"
                + " same stiffness. The most credits no loss."),
        heading("Checks"),
        paragraph(
            "Each is worked out for every load case at every temperature by every stiffness method"
                + " that applies; what is shown is the worst, and it says which. Margins are there"
                + " over asked less 1. Factors are 1.0 until set. The forms are those of VDI 2230,"
                + " NASA-STD-5020B, EN 1993-1-8 and FED-STD-H28, largely from memory: each check's"
                + " working says so. Check them against the edition that binds you."),
        heading("What matters"),
        paragraph(
            "Every input with a stated tolerance goes to its limits alone; the bars show how far"
                + " the margin moves. Random joints have all inputs off at once, normal with the"
                + " limits at three deviations, half-angle and n even."),
        heading("Limits"),
        paragraph(
            "Concentric load, one bolt, elastic members; no prying, no gasket curve, no plate"
                + " bending. The cone itself is an assumption: taken at 45° with one cylinder per"
                + " part, members can come out two to four times too stiff, worst with one thick"
                + " part. Then the load factor is too small, which is unsafe for the bolt's"
                + " strength and fatigue. Look at the spread over methods, not at one number."));
  }

  static Node about() {
    return text(
        heading("Clampwright"),
        paragraph("Draw a bolted stack, see its pressure cones, read its margins."),
        paragraph(Sentences.CAUTION),
        paragraph(
            "Table values carry their source and how sure it is; rest the pointer on a field to"
                + " see it. Some are from memory and say so."),
        paragraph(
            "Built with OpenJFX, AtlantaFX, Gson, Apache Commons CSV, Statistics and RNG, OpenPDF, picocli and the Liberation"
                + " fonts, under their licences."));
  }

  /** Every key, from the bindings themselves. */
  static Node keys(Commands commands) {
    GridPane grid = new GridPane();
    grid.getStyleClass().add("keys");
    grid.setHgap(28);
    grid.setVgap(5);
    commands
        .menus()
        .forEach(
            (menu, list) -> {
              addHeading(grid, menu);
              list.stream()
                  .filter(command -> !command.keys().isEmpty())
                  .forEach(command -> addKey(grid, command.text().get(), names(command.keys())));
            });
    addHeading(grid, "On the drawing");
    SectionPane.keys().forEach(key -> addKey(grid, key.does(), key.name()));
    VBox page = new VBox(grid);
    page.getStyleClass().add("help-page");
    return page;
  }

  private static void addHeading(GridPane grid, String text) {
    Label heading = heading(text);
    GridPane.setMargin(heading, new Insets(grid.getRowCount() == 0 ? 0 : 10, 0, 2, 0));
    grid.add(heading, 0, grid.getRowCount(), 2, 1);
  }

  private static void addKey(GridPane grid, String what, String keys) {
    grid.addRow(grid.getRowCount(), new Label(what), new Label(keys));
  }

  private static String names(List<KeyCombination> keys) {
    List<String> names = new ArrayList<>();
    for (KeyCombination combination : keys) {
      names.add(combination.getDisplayText());
    }
    return String.join("  or  ", names);
  }

  private static Node text(Node... parts) {
    VBox page = new VBox(6, parts);
    page.getStyleClass().add("help-page");
    return page;
  }

  private static Label heading(String text) {
    Label label = new Label(text);
    label.getStyleClass().add("help-heading");
    return label;
  }

  private static MathText paragraph(String text) {
    MathText paragraph = new MathText("help-text");
    paragraph.show(text);
    paragraph.setMaxWidth(560);
    return paragraph;
  }
}
