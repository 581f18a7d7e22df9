package clampwright.catalog;

import clampwright.joint.Material;
import clampwright.joint.Material.Family;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVRecord;

/** Reads the materials; those without a modulus cannot be used and are left out. */
final class Materials {
  private static final BigDecimal PER_GPA = new BigDecimal("1000");
  private static final BigDecimal PER_MILLION = new BigDecimal("0.000001");

  private Materials() {}

  static List<Entry<Material>> read() {
    List<Entry<Material>> materials = new ArrayList<>();
    for (CSVRecord row : Table.read("materials")) {
      OptionalDouble modulus = Table.scaled(row, "E_GPa", PER_GPA);
      if (modulus.isPresent()) {
        materials.add(entry(row, modulus.getAsDouble()));
      }
    }
    return List.copyOf(materials);
  }

  private static Entry<Material> entry(CSVRecord row, double modulus) {
    String name = row.get("material").replace("gray", "grey");
    Material material =
        new Material(
            name,
            family(name),
            modulus,
            Table.number(row, "poisson"),
            Table.scaled(row, "CTE_1e-6_per_K", PER_MILLION));
    String provenance =
        "E " + row.get("E_provenance") + ", expansion " + orNone(row.get("CTE_provenance"));
    String source = row.get("E_source") + "; " + orNone(row.get("CTE_source"));
    return new Entry<>(name, family(name).name(), material, source, provenance);
  }

  private static String orNone(String text) {
    return text.isEmpty() ? "none" : text;
  }

  static Family family(String name) {
    if (name.contains("steel") || name.contains("stainless") || name.contains("A-286")) {
      return Family.STEEL;
    }
    if (name.contains("aluminium")) {
      return Family.ALUMINIUM;
    }
    if (name.contains("copper") || name.contains("brass")) {
      return Family.COPPER;
    }
    return name.contains("grey cast iron") ? Family.GREY_IRON : Family.OTHER;
  }
}
