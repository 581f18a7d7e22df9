package clampwright.view;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.text.Text;
import javafx.scene.text.TextFlow;

/** A text that wraps, with what follows an underscore set as an index: k_m, D_head. */
public final class MathText extends TextFlow {
  private static final Pattern INDEX = Pattern.compile("(?<=[\\p{L}])_([\\p{L}\\p{Nd}']+)");
  private static final double DROP = 2.5;

  private String shown = "";

  public MathText(String... styles) {
    getStyleClass().add("math");
    getStyleClass().addAll(styles);
    setAccessibleRole(AccessibleRole.TEXT);
  }

  /** The text as given, underscores and all. */
  public String text() {
    return shown;
  }

  public void show(String text) {
    if (!text.equals(shown)) {
      shown = text;
      setAccessibleText(text);
      getChildren().setAll(pieces(text));
    }
  }

  private static List<Node> pieces(String text) {
    List<Node> pieces = new ArrayList<>();
    Matcher index = INDEX.matcher(text);
    int from = 0;
    while (index.find()) {
      pieces.add(new Text(text.substring(from, index.start())));
      Text low = new Text(index.group(1));
      low.getStyleClass().add("index");
      low.setTranslateY(DROP);
      pieces.add(low);
      from = index.end();
    }
    if (from < text.length()) {
      pieces.add(new Text(text.substring(from)));
    }
    return pieces;
  }
}
