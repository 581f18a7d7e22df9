package clampwright.paint.print;

import clampwright.figure.Figure;
import clampwright.figure.Mark;
import clampwright.figure.Point;
import clampwright.figure.Role;
import clampwright.joint.Part;
import clampwright.paint.ArrowHead;
import clampwright.paint.Look;
import clampwright.paint.Palette;
import clampwright.paint.PillParts;
import java.io.StringWriter;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;

/** A figure as SVG: real text, title and description, marks grouped by the part they depict. */
public final class SvgPicture {
  private static final String NAMESPACE = "http://www.w3.org/2000/svg";

  private final XMLStreamWriter xml;
  private final Palette palette;

  private SvgPicture(XMLStreamWriter xml, Palette palette) {
    this.xml = xml;
    this.palette = palette;
  }

  /**
   * The picture as text, in UTF-8 when it is written.
   *
   * @param description for whoever cannot see it
   * @param names what a part is called, for its groups
   */
  public static String of(
      Figure figure, Palette palette, String description, Function<Part, String> names) {
    StringWriter text = new StringWriter();
    try {
      XMLStreamWriter xml = XMLOutputFactory.newInstance().createXMLStreamWriter(text);
      new SvgPicture(xml, palette).write(figure, description, names);
      xml.close();
    } catch (XMLStreamException impossible) {
      throw new IllegalStateException("the picture cannot be written as XML", impossible);
    }
    return text.toString();
  }

  private void write(Figure figure, String description, Function<Part, String> names)
      throws XMLStreamException {
    xml.writeStartDocument("UTF-8", "1.0");
    xml.writeCharacters("\n");
    xml.writeStartElement("svg");
    xml.writeDefaultNamespace(NAMESPACE);
    attribute("width", number(figure.width()) + "mm");
    attribute("height", number(figure.height()) + "mm");
    attribute("viewBox", "0 0 " + number(figure.width()) + " " + number(figure.height()));
    attribute("font-family", "'Liberation Sans', Arial, Helvetica, sans-serif");
    element("title", clean(figure.title()));
    element("desc", clean(description));
    xml.writeEmptyElement("rect");
    attribute("width", number(figure.width()));
    attribute("height", number(figure.height()));
    attribute("fill", colour(palette.paper()));
    xml.writeCharacters("\n");
    marks(figure.marks(), names);
    xml.writeEndElement();
    xml.writeEndDocument();
  }

  /** Marks stay in painting order; neighbours of one part share a group. */
  private void marks(List<Mark> marks, Function<Part, String> names) throws XMLStreamException {
    Part open = null;
    for (Mark mark : marks) {
      Part part = mark.tag().part();
      if (!part.equals(open)) {
        if (open != null) {
          xml.writeEndElement();
        }
        xml.writeStartElement("g");
        attribute("data-part", clean(names.apply(part)));
        xml.writeCharacters("\n");
        open = part;
      }
      mark(mark, palette.of(mark.role()));
      xml.writeCharacters("\n");
    }
    if (open != null) {
      xml.writeEndElement();
    }
  }

  private void mark(Mark mark, Look look) throws XMLStreamException {
    if (mark instanceof Mark.Path path) {
      xml.writeEmptyElement("path");
      role(mark.role());
      attribute("d", data(path.points(), path.closed()));
      pen(look);
    } else if (mark instanceof Mark.Area area) {
      xml.writeEmptyElement("path");
      role(mark.role());
      attribute("d", data(area.points(), true));
      paint("fill", look.fill());
    } else if (mark instanceof Mark.Hatch hatch) {
      xml.writeEmptyElement("path");
      role(mark.role());
      attribute("d", strokes(hatch.strokes()));
      pen(look);
    } else if (mark instanceof Mark.Text text) {
      text(text, look.stroke(), mark.role().name());
    } else if (mark instanceof Mark.Disc disc) {
      disc(disc, look);
    } else if (mark instanceof Mark.Pill pill) {
      pill(pill, look);
    } else if (mark instanceof Mark.Arrow arrow) {
      arrow(arrow, look);
    }
  }

  private void disc(Mark.Disc disc, Look look) throws XMLStreamException {
    xml.writeEmptyElement("circle");
    role(disc.role());
    attribute("cx", number(disc.centre().x()));
    attribute("cy", number(disc.centre().y()));
    attribute("r", number(disc.radius()));
    paint("fill", disc.filled() ? look.stroke() : look.fill());
    stroke(look);
  }

  private void arrow(Mark.Arrow arrow, Look look) throws XMLStreamException {
    xml.writeStartElement("g");
    role(arrow.role());
    xml.writeEmptyElement("path");
    attribute("d", data(List.of(arrow.from(), arrow.to()), false));
    pen(look);
    for (List<Point> head : ArrowHead.of(arrow, look.width())) {
      xml.writeEmptyElement("path");
      attribute("d", data(head, true));
      paint("fill", look.fill());
    }
    xml.writeEndElement();
  }

  private void pill(Mark.Pill pill, Look look) throws XMLStreamException {
    xml.writeStartElement("g");
    role(pill.role());
    xml.writeEmptyElement("rect");
    attribute("x", number(pill.x()));
    attribute("y", number(pill.y()));
    attribute("width", number(pill.width()));
    attribute("height", number(pill.height()));
    attribute("rx", number(pill.height() / 2));
    paint("fill", look.fill());
    stroke(look);
    PillParts parts = PillParts.of(pill);
    if (!parts.symbol().isEmpty()) {
      xml.writeEmptyElement("path");
      attribute("d", data(parts.symbol(), true));
      paint("fill", look.stroke());
    }
    text(parts.letter(), look.stroke(), "");
    text(parts.text(), palette.of(Role.NAME).stroke(), "");
    xml.writeEndElement();
  }

  private void text(Mark.Text text, int colour, String role) throws XMLStreamException {
    if (text.text().isEmpty()) {
      return;
    }
    xml.writeStartElement("text");
    if (!role.isEmpty()) {
      attribute("data-role", role);
    }
    attribute("x", number(text.at().x()));
    attribute("y", number(text.at().y()));
    attribute("font-size", number(text.size()));
    if (text.weight() == Mark.Weight.BOLD) {
      attribute("font-weight", "bold");
    }
    if (text.anchor() != Mark.Anchor.START) {
      attribute("text-anchor", text.anchor() == Mark.Anchor.END ? "end" : "middle");
    }
    paint("fill", colour);
    xml.writeCharacters(clean(text.text()));
    xml.writeEndElement();
  }

  private void role(Role role) throws XMLStreamException {
    attribute("data-role", role.name());
  }

  private void pen(Look look) throws XMLStreamException {
    attribute("fill", "none");
    stroke(look);
    if (look.dash().length > 0) {
      String dashes =
          java.util.Arrays.stream(look.dash())
              .mapToObj(SvgPicture::number)
              .collect(Collectors.joining(" "));
      attribute("stroke-dasharray", dashes);
    }
  }

  private void stroke(Look look) throws XMLStreamException {
    if (look.width() > 0) {
      paint("stroke", look.stroke());
      attribute("stroke-width", number(look.width()));
    }
  }

  private void paint(String attribute, int argb) throws XMLStreamException {
    int alpha = argb >>> 24;
    attribute(attribute, alpha == 0 ? "none" : colour(argb));
    if (alpha != 0 && alpha != 255) {
      attribute(attribute + "-opacity", number(alpha / 255.0));
    }
  }

  private void attribute(String name, String value) throws XMLStreamException {
    xml.writeAttribute(name, value);
  }

  private void element(String name, String text) throws XMLStreamException {
    xml.writeStartElement(name);
    xml.writeCharacters(text);
    xml.writeEndElement();
    xml.writeCharacters("\n");
  }

  private static String colour(int argb) {
    return String.format(Locale.ROOT, "#%06x", argb & 0xFFFFFF);
  }

  private static String data(List<Point> points, boolean closed) {
    StringBuilder data = new StringBuilder();
    for (Point point : points) {
      data.append(data.isEmpty() ? "M" : "L")
          .append(number(point.x()))
          .append(' ')
          .append(number(point.y()));
    }
    return data + (closed ? "Z" : "");
  }

  private static String strokes(List<Point> strokes) {
    StringBuilder data = new StringBuilder();
    for (int i = 0; i + 1 < strokes.size(); i += 2) {
      data.append(data(strokes.subList(i, i + 2), false));
    }
    return data.toString();
  }

  /** To a ten-thousandth of a millimetre, without needless zeros. */
  private static String number(double value) {
    String text = String.format(Locale.ROOT, "%.4f", value);
    String trimmed = text.replaceAll("\\.?0+$", "");
    return trimmed.equals("-0") ? "0" : trimmed;
  }

  /** Without the characters that XML has no place for. */
  private static String clean(String text) {
    StringBuilder clean = new StringBuilder();
    text.codePoints()
        .filter(
            c ->
                c == '\t'
                    || c == '\n'
                    || c >= 0x20 && c <= 0xD7FF
                    || c >= 0xE000 && c <= 0xFFFD
                    || c >= 0x10000)
        .forEach(clean::appendCodePoint);
    return clean.toString();
  }
}
