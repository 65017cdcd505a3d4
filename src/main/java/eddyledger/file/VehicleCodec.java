package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Settings;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;

/** A whole vehicle: the root object of the file. */
final class VehicleCodec implements RecordCodec<Vehicle> {
  static final VehicleCodec VEHICLE = new VehicleCodec();

  private static final String VEHICLE_KEY = "vehicle";
  private static final String TIGHT_BAND = "tight_band_dB";
  private static final String DESCRIPTION = "description";
  private static final String CONDITIONS = "conditions";
  private static final String ZONES = "zones";
  private static final String APERTURES = "apertures";
  private static final String RECEIVERS = "receivers";
  private static final String CONSTRUCTIONS = "constructions";
  private static final String LAY_UPS = "lay_ups";
  private static final String SUPPLIERS = "suppliers";
  private static final String OTHER_SOURCES = "other_sources";
  private static final String TARGETS = "targets";
  private static final String ALLOWANCES = "allowances";
  private static final String TREE = "tree";
  private static final String CHANGE_LOG = "change_log";

  private VehicleCodec() {}

  @Override
  public Vehicle read(JsonObject root) {
    FormatVersion.KEYS.forEach(root::value);
    JsonValue value = root.value(VEHICLE_KEY);
    if (value.absent()) {
      value.wholeFault("missing-value", "The vehicle is missing.", "Describe it.");
    }
    JsonObject object = value.object();
    String id = object.text("id");
    String name = object.requiredText("name");
    String description = object.text(DESCRIPTION);
    Double tightBand = object.number(TIGHT_BAND);
    Settings settings = SettingsCodec.read(object);
    root.keep(VEHICLE_KEY, object.extras());
    return VehicleBuilder.named(id, name)
        .description(description)
        .tightBand(tightBand)
        .settings(settings)
        .conditions(root.records(CONDITIONS, ConditionCodec.CONDITION))
        .zones(root.records(ZONES, ZoneCodec.ZONE))
        .apertures(root.records(APERTURES, ApertureCodec.APERTURE))
        .receivers(root.records(RECEIVERS, ReceiverCodec.RECEIVER))
        .constructions(root.records(CONSTRUCTIONS, ConstructionCodec.CONSTRUCTION))
        .layUps(root.records(LAY_UPS, LayUpCodec.LAY_UP))
        .suppliers(root.records(SUPPLIERS, SupplierCodec.SUPPLIER))
        .otherSources(root.records(OTHER_SOURCES, OtherSourceCodec.OTHER_SOURCE))
        .targets(root.records(TARGETS, TargetCodec.TARGET))
        .allowances(root.records(ALLOWANCES, AllowanceCodec.ALLOWANCE))
        .tree(root.records(TREE, NodeCodec.NODE))
        .changeLog(root.records(CHANGE_LOG, ChangeCodec.CHANGE))
        .extras(root.extras())
        .build();
  }

  @Override
  public ObjectNode write(Vehicle vehicle) {
    JsonBuilder head =
        new JsonBuilder()
            .text("id", vehicle.id())
            .name("name", vehicle.name())
            .text(DESCRIPTION, vehicle.description())
            .number(TIGHT_BAND, vehicle.tightBand());
    SettingsCodec.write(head, vehicle.settings());
    return FormatVersion.begin()
        .object(VEHICLE_KEY, head)
        .records(CONDITIONS, vehicle.conditions(), ConditionCodec.CONDITION)
        .records(ZONES, vehicle.zones(), ZoneCodec.ZONE)
        .records(APERTURES, vehicle.apertures(), ApertureCodec.APERTURE)
        .records(RECEIVERS, vehicle.receivers(), ReceiverCodec.RECEIVER)
        .records(CONSTRUCTIONS, vehicle.constructions(), ConstructionCodec.CONSTRUCTION)
        .records(LAY_UPS, vehicle.layUps(), LayUpCodec.LAY_UP)
        .records(SUPPLIERS, vehicle.suppliers(), SupplierCodec.SUPPLIER)
        .records(OTHER_SOURCES, vehicle.otherSources(), OtherSourceCodec.OTHER_SOURCE)
        .records(TARGETS, vehicle.targets(), TargetCodec.TARGET)
        .records(ALLOWANCES, vehicle.allowances(), AllowanceCodec.ALLOWANCE)
        .records(TREE, vehicle.tree(), NodeCodec.NODE)
        .records(CHANGE_LOG, vehicle.changeLog(), ChangeCodec.CHANGE)
        .with(vehicle.extras());
  }
}
