package clampwright.catalog;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/** Rows of a CSV resource with a header. */
final class Table {
  /**
   * Exact by definition (NIST SP 811, appendix B): 25.4 mm to the inch, 4.4482216152605 N to the
   * pound-force.
   */
  static final BigDecimal INCH = new BigDecimal("25.4");

  private static final BigDecimal KSI =
      new BigDecimal("4448.2216152605").divide(INCH.multiply(INCH), new MathContext(40));

  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).setTrim(true).get();

  private Table() {}

  static List<CSVRecord> read(String name) {
    try (InputStream in = Table.class.getResourceAsStream(name + ".csv")) {
      if (in == null) {
        throw new IOException("the table " + name + " is missing from the program");
      }
      return FORMAT.parse(new InputStreamReader(in, StandardCharsets.UTF_8)).getRecords();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A number; empty where the cell is. */
  static OptionalDouble number(CSVRecord row, String column) {
    return scaled(row, column, BigDecimal.ONE);
  }

  /**
   * A number times a factor, multiplied in decimal so that 0.007 in is 0.1778 mm to the last digit;
   * empty where the cell is.
   */
  static OptionalDouble scaled(CSVRecord row, String column, BigDecimal factor) {
    String cell = row.get(column);
    return cell.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(new BigDecimal(cell).multiply(factor).doubleValue());
  }

  /** A length in the row's own unit [mm]; empty where the cell is. */
  static OptionalDouble length(CSVRecord row, String column) {
    return scaled(row, column, row.get("unit").equals("in") ? INCH : BigDecimal.ONE);
  }

  /** A stress in the row's own unit [MPa]; empty where the cell is. */
  static OptionalDouble stress(CSVRecord row, String column) {
    return scaled(row, column, row.get("unit").equals("ksi") ? KSI : BigDecimal.ONE);
  }
}
