package org.gasmargin.job;

import java.util.List;
import java.util.Optional;
import org.gasmargin.units.Quantity;
import org.gasmargin.vessel.Layer;
import org.gasmargin.vessel.Material;
import org.gasmargin.vessel.MaterialCatalogue;
import org.gasmargin.yaml.Fields;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Texts;
import org.gasmargin.yaml.Value;

/** Reads one layer: a thickness with a material's name or with its three numbers. */
final class LayerReader {
  private static final double ROOM_TEMPERATURE = 293.15;

  private final MaterialCatalogue materials;
  private final Quantities quantities;
  private final Issues issues;

  LayerReader(MaterialCatalogue materials, Quantities quantities) {
    this.materials = materials;
    this.quantities = quantities;
    issues = quantities.issues();
  }

  /** The layer, or empty after an issue was added. */
  Optional<Layer> read(Value value) {
    return Fields.of(
            value, issues, "material", "thickness", "conductivity", "density", "heat_capacity")
        .flatMap(this::layer);
  }

  private Optional<Layer> layer(Fields fields) {
    Optional<Material> material = fields.has("material") ? named(fields) : byNumbers(fields);
    Optional<Quantity> thickness = quantities.needed(fields, "thickness", InputKind.THICKNESS);
    return material.flatMap(made -> thickness.map(depth -> new Layer(made, depth.si())));
  }

  private Optional<Material> named(Fields fields) {
    for (String key : List.of("conductivity", "density", "heat_capacity")) {
      if (fields.has(key)) {
        issues.add(
            fields.find(key).orElseThrow().key(),
            key + " stands beside material " + fields.owner().within(),
            "give the material's name or its three numbers, not both");
        return Optional.empty();
      }
    }
    Value value = fields.find("material").orElseThrow();
    return Texts.word(value, issues).flatMap(name -> known(value, name));
  }

  private Optional<Material> known(Value value, String name) {
    Optional<Material> material = materials.find(name);
    if (material.isEmpty()) {
      Texts.unknown(value, "material", name, materials.names(), issues);
    }
    return material;
  }

  private Optional<Material> byNumbers(Fields fields) {
    if (!fields.has("conductivity") && !fields.has("density") && !fields.has("heat_capacity")) {
      issues.add(
          fields.owner().key(),
          "missing key 'material' " + fields.owner().within(),
          "give a material's name, or conductivity, density and heat_capacity");
      return Optional.empty();
    }
    Optional<Double> conductivity =
        quantities.number(fields, "conductivity", InputKind.CONDUCTIVITY);
    Optional<Double> density = quantities.number(fields, "density", InputKind.DENSITY);
    Optional<Double> heatCapacity =
        quantities.number(fields, "heat_capacity", InputKind.HEAT_CAPACITY);
    if (conductivity.isEmpty() || density.isEmpty() || heatCapacity.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Material(
            "user material",
            density.get(),
            List.of(new Material.Point(ROOM_TEMPERATURE, conductivity.get(), heatCapacity.get())),
            "numbers typed in the job"));
  }
}
