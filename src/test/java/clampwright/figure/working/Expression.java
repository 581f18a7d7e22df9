package clampwright.figure.working;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Follows the numbers of a step as a person with a pocket calculator would: × / + − ² √ π and
 * functions; angles in degrees for tan and atan.
 */
final class Expression {
  private static final Pattern TOKEN =
      Pattern.compile("\\s*(\\d+(?:\\.\\d+)?(?:E[+-]?\\d+)?|[a-z]+|[π√²°×/+−(),])");

  private final List<String> tokens = new ArrayList<>();
  private int at;

  private Expression(String text) {
    Matcher matcher = TOKEN.matcher(text);
    int end = 0;
    while (matcher.lookingAt()) {
      tokens.add(matcher.group(1));
      end = matcher.end();
      matcher.region(end, text.length());
    }
    if (end != text.length()) {
      throw new AssertionError("cannot read '" + text.substring(end) + "' in '" + text + "'");
    }
  }

  static double value(String text) {
    Expression expression = new Expression(text);
    double value = expression.sum();
    if (expression.at != expression.tokens.size()) {
      throw new AssertionError("left over in '" + text + "'");
    }
    return value;
  }

  /** The largest number that is put in. */
  static double largest(String text) {
    return new Expression(text)
        .tokens.stream()
            .filter(token -> Character.isDigit(token.charAt(0)))
            .mapToDouble(Double::parseDouble)
            .max()
            .orElse(0);
  }

  private double sum() {
    double value = product();
    while (is("+") || is("−")) {
      value = next().equals("+") ? value + product() : value - product();
    }
    return value;
  }

  private double product() {
    double value = power();
    while (is("×") || is("/")) {
      value = next().equals("×") ? value * power() : value / power();
    }
    return value;
  }

  private double power() {
    double value = atom();
    while (is("²") || is("°")) {
      value = next().equals("²") ? value * value : value;
    }
    return value;
  }

  private double atom() {
    String token = next();
    return switch (token) {
      case "(" -> closed(sum());
      case "−" -> -atom();
      case "π" -> Math.PI;
      case "√" -> Math.sqrt(atom());
      case "tan" -> Math.tan(Math.toRadians(power()));
      case "atan" -> Math.toDegrees(Math.atan(atom()));
      case "acos" -> Math.acos(atom());
      case "ln" -> Math.log(atom());
      case "exp" -> Math.exp(atom());
      case "min" -> extreme(false);
      case "max" -> extreme(true);
      default -> Double.parseDouble(token);
    };
  }

  private double extreme(boolean largest) {
    next();
    double value = sum();
    while (is(",")) {
      next();
      value = largest ? Math.max(value, sum()) : Math.min(value, sum());
    }
    return closed(value);
  }

  private double closed(double value) {
    if (!next().equals(")")) {
      throw new AssertionError("bracket not closed in " + tokens);
    }
    return value;
  }

  private boolean is(String token) {
    return at < tokens.size() && tokens.get(at).equals(token);
  }

  private String next() {
    return tokens.get(at++);
  }
}
