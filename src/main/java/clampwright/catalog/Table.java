package clampwright.catalog;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;

/** Rows of a CSV resource with a header. */
final class Table {
  private static final double INCH = 25.4;
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
    String cell = row.get(column);
    return cell.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(cell));
  }

  /** A length in the row's own unit [mm]; empty where the cell is. */
  static OptionalDouble length(CSVRecord row, String column) {
    OptionalDouble value = number(row, column);
    boolean inch = row.get("unit").equals("in");
    return inch && value.isPresent() ? OptionalDouble.of(value.getAsDouble() * INCH) : value;
  }
}
