package clampwright.paint.canvas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.figure.Mark;
import clampwright.figure.TextWidth;
import java.util.List;
import javafx.scene.text.Text;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.testfx.framework.junit5.ApplicationExtension;

/** The widths that labels are placed by are those of the typeface that is painted. */
@ExtendWith(ApplicationExtension.class)
class TextWidthTest {
  private static final double SIZE = 200;

  @ParameterizedTest
  @EnumSource(Mark.Weight.class)
  void everyPrintableLetterIsAsWideAsPainted(Mark.Weight weight) {
    for (char letter = ' '; letter <= '~'; letter++) {
      same(String.valueOf(letter), weight, 0.004 * SIZE);
    }
  }

  @ParameterizedTest
  @EnumSource(Mark.Weight.class)
  void signsOfTheTradeAreNearlyAsWideAsPainted(Mark.Weight weight) {
    String signs = "Ø·–−°²≤≥…äöüß×±µ";
    for (int i = 0; i < signs.length(); i++) {
      same(signs.substring(i, i + 1), weight, 0.07 * SIZE);
    }
  }

  @Test
  void cutTextFits() {
    String text = "stainless 18-8 / 304";
    String cut = TextWidth.cut(text, 20, 3, Mark.Weight.REGULAR);
    assertTrue(TextWidth.of(cut, 3, Mark.Weight.REGULAR) <= 20);
    assertTrue(cut.endsWith("…") && text.startsWith(cut.substring(0, cut.length() - 1)));
    assertEquals(text, TextWidth.cut(text, 40, 3, Mark.Weight.REGULAR));
  }

  @Test
  void wrappedLinesKeepAllWordsInOrder() {
    String text = "Hole 40 mm is not smaller than the pressure zone 24.6 mm here.";
    List<String> lines = TextWidth.wrapped(text, 25, 3, Mark.Weight.BOLD);
    assertEquals(text, String.join(" ", lines));
    assertTrue(lines.size() > 2);
    for (String line : lines) {
      assertTrue(TextWidth.of(line, 3, Mark.Weight.BOLD) <= 25, line);
    }
  }

  private static void same(String text, Mark.Weight weight, double tolerance) {
    Text painted = new Text(text);
    painted.setFont(Fonts.of(weight, SIZE));
    double width = painted.getLayoutBounds().getWidth();
    assertEquals(width, TextWidth.of(text, SIZE, weight), tolerance, text);
  }
}
