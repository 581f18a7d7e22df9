package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.LoadCase;
import clampwright.joint.Service;
import clampwright.joint.Sketch;
import clampwright.joint.TemperatureCase;
import clampwright.quantity.Dimension;
import clampwright.view.field.NameField;
import clampwright.view.field.SketchNumber;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;
import java.util.function.UnaryOperator;

/** Temperatures at assembly and in service; load cases name the latter and follow their names. */
final class TemperatureFields {
  private TemperatureFields() {}

  static Service service(Sketch sketch) {
    return sketch.joint().service();
  }

  private static Sketch with(Sketch sketch, UnaryOperator<Service> change) {
    return sketch.withJoint(joint -> joint.withService(change.apply(joint.service())));
  }

  static SketchNumber assembly() {
    return SketchNumber.required(
        "Temperature at assembly",
        Dimension.TEMPERATURE,
        sketch -> service(sketch).assembly(),
        (sketch, value) -> with(sketch, service -> service.withAssembly(value)));
  }

  static SketchNumber members(int index) {
    return of(
        index,
        "Temperature of the members",
        TemperatureCase::members,
        TemperatureCase::withMembers);
  }

  static SketchNumber bolt(int index) {
    return of(index, "Temperature of the bolt", TemperatureCase::bolt, TemperatureCase::withBolt);
  }

  private static SketchNumber of(
      int index,
      String name,
      ToDoubleFunction<TemperatureCase> read,
      BiFunction<TemperatureCase, Double, TemperatureCase> write) {
    return SketchNumber.sometimes(
        name,
        Dimension.TEMPERATURE,
        sketch ->
            state(sketch, index)
                .map(state -> OptionalDouble.of(read.applyAsDouble(state)))
                .orElse(OptionalDouble.empty()),
        (sketch, value) ->
            with(
                sketch,
                service -> service.withTemperature(index, state -> write.apply(state, value))));
  }

  static Optional<TemperatureCase> state(Sketch sketch, int index) {
    List<TemperatureCase> states = service(sketch).temperatures();
    return index < states.size() ? Optional.of(states.get(index)) : Optional.empty();
  }

  /**
   * The name of a temperature case. The load cases that go with it when typing begins keep to it,
   * whatever other names are passed through on the way.
   */
  static NameField name(SketchModel model, int index) {
    List<Integer> followers = new ArrayList<>();
    NameField field =
        new NameField(
            model,
            "Temperature case name",
            sketch -> state(sketch, index).map(TemperatureCase::name),
            (sketch, name) -> renamed(sketch, index, name, followers));
    field
        .focusedProperty()
        .addListener(
            observable -> {
              followers.clear();
              followers.addAll(followers(model.sketch(), index));
            });
    return field;
  }

  /** The load cases that go with a temperature case; of two of one name the first is meant. */
  private static List<Integer> followers(Sketch sketch, int index) {
    List<TemperatureCase> states = service(sketch).temperatures();
    List<Integer> followers = new ArrayList<>();
    List<String> names = states.stream().map(TemperatureCase::name).toList();
    if (index < names.size() && names.indexOf(names.get(index)) == index) {
      List<LoadCase> loads = service(sketch).loads();
      for (int i = 0; i < loads.size(); i++) {
        if (loads.get(i).temperature().equals(Optional.of(names.get(index)))) {
          followers.add(i);
        }
      }
    }
    return followers;
  }

  private static Sketch renamed(Sketch sketch, int index, String name, List<Integer> followers) {
    Service service = service(sketch).withTemperature(index, state -> state.withName(name));
    for (int follower : followers) {
      if (follower < service.loads().size()) {
        service = service.withLoad(follower, load -> load.withTemperature(Optional.of(name)));
      }
    }
    Service renamed = service;
    return with(sketch, before -> renamed);
  }

  /** With one more case, at first as warm as at assembly. */
  static Sketch added(Sketch sketch) {
    List<TemperatureCase> states = new ArrayList<>(service(sketch).temperatures());
    List<String> taken = states.stream().map(TemperatureCase::name).toList();
    String name = FreeName.of("Temperature ", states.size() + 1, taken);
    double assembly = service(sketch).assembly();
    states.add(new TemperatureCase(name, assembly, assembly));
    return with(sketch, service -> service.withTemperatures(states));
  }

  /** Without a case; the loads that went with it then meet any. */
  static Sketch removed(Sketch sketch, int index) {
    List<Integer> followers = followers(sketch, index);
    Service service = service(sketch);
    for (int follower : followers) {
      service = service.withLoad(follower, load -> load.withTemperature(Optional.empty()));
    }
    List<TemperatureCase> states = new ArrayList<>(service.temperatures());
    states.remove(index);
    Service removed = service.withTemperatures(states);
    return with(sketch, before -> removed);
  }
}
