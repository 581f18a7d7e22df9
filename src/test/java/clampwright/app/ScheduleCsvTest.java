package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.store.Samples;
import clampwright.store.Stored;
import java.io.IOException;
import java.io.StringReader;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;

/** The schedule as comma-separated values. */
class ScheduleCsvTest {
  private static List<CSVRecord> records(int sample) throws IOException {
    Stored.Opened opened = (Stored.Opened) Samples.open(Samples.all().get(sample));
    String text = ScheduleCsv.of(opened.sketch());
    try (CSVParser parser = CSVFormat.RFC4180.parse(new StringReader(text))) {
      return parser.getRecords();
    }
  }

  /** The lid worked by hand (see GearboxLidTest): 7 and 30.5 deep, Ø 28.63. */
  @Test
  void aRowOfThePartsAsTheyStand() throws IOException {
    List<CSVRecord> records = records(0);
    assertEquals(7, records.size());
    assertEquals("Thickness mm", records.get(0).get(3));
    CSVRecord lid = records.get(2);
    assertEquals(
        List.of("2", "Lid", "aluminium 6061", "10", "11", "wide", "7", "30.5", "head"),
        lid.toList().subList(0, 9));
    assertEquals(28.63, Double.parseDouble(lid.get(9)), 1e-9);
    assertEquals("edges 24 and 60", records.get(5).get(5));
  }
}
