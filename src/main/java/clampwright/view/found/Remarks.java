package clampwright.view.found;

import clampwright.joint.Part;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.scene.layout.VBox;

/** Sentences that each point at a part; pressing one selects the part. */
final class Remarks extends VBox {

  /**
   * One sentence.
   *
   * @param part it concerns
   * @param sentence what it says
   */
  record Remark(Part part, String sentence) {}

  private final Function<Part, String> names;
  private final Consumer<Part> select;
  private List<Remark> shown = List.of();

  /**
   * An empty list.
   *
   * @param names how a part is called
   * @param select what pressing a sentence does
   */
  Remarks(Function<Part, String> names, Consumer<Part> select) {
    this.names = names;
    this.select = select;
    getStyleClass().add("remarks");
  }

  void show(List<Remark> remarks) {
    if (!remarks.equals(shown)) {
      shown = List.copyOf(remarks);
      getChildren().setAll(remarks.stream().map(this::line).toList());
    }
  }

  private RemarkLine line(Remark remark) {
    return new RemarkLine(
        names.apply(remark.part), remark.sentence, () -> select.accept(remark.part));
  }
}
