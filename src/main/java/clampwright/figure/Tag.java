package clampwright.figure;

import clampwright.joint.Feature;
import clampwright.joint.Part;
import java.util.Objects;
import java.util.Optional;

/**
 * What a mark stands for, what it depicts, and what can be dragged by it.
 *
 * @param role decides the look
 * @param part what is depicted
 * @param feature what taking hold of the mark changes; empty when it only selects
 */
public record Tag(Role role, Part part, Optional<Feature> feature) {
  public Tag {
    Objects.requireNonNull(role, "role");
    Objects.requireNonNull(part, "part");
    Objects.requireNonNull(feature, "feature");
  }

  public static Tag of(Role role, Part part) {
    return new Tag(role, part, Optional.empty());
  }

  public static Tag of(Role role, Part part, Feature feature) {
    return new Tag(role, part, Optional.of(feature));
  }
}
