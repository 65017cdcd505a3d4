package eddyledger.model;

import java.util.List;

/** A changeable copy of a {@link Vehicle}; {@link #build()} makes the record. */
public final class VehicleBuilder {
  private String id;
  private String name;
  private String description;
  private Double tightBand;
  private Settings settings;
  private List<OperatingCondition> conditions;
  private List<Zone> zones;
  private List<Aperture> apertures;
  private List<Receiver> receivers;
  private List<Construction> constructions;
  private List<LayUp> layUps;
  private List<Supplier> suppliers;
  private List<OtherSource> otherSources;
  private List<Target> targets;
  private List<Allowance> allowances;
  private List<Node> tree;
  private List<ChangeEntry> changeLog;
  private Extras extras;

  VehicleBuilder(Vehicle from) {
    id = from.id();
    name = from.name();
    description = from.description();
    tightBand = from.tightBand();
    settings = from.settings();
    conditions = from.conditions();
    zones = from.zones();
    apertures = from.apertures();
    receivers = from.receivers();
    constructions = from.constructions();
    layUps = from.layUps();
    suppliers = from.suppliers();
    otherSources = from.otherSources();
    targets = from.targets();
    allowances = from.allowances();
    tree = from.tree();
    changeLog = from.changeLog();
    extras = from.extras();
  }

  /** An empty vehicle of an id and a name. */
  public static VehicleBuilder named(String id, String name) {
    return new VehicleBuilder(
        new Vehicle(
            id,
            name,
            null,
            null,
            Settings.NONE,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            Extras.NONE));
  }

  /** Sets the name shown. */
  public VehicleBuilder name(String value) {
    name = value;
    return this;
  }

  /** Sets the description. */
  public VehicleBuilder description(String value) {
    description = value;
    return this;
  }

  /** Sets the tight band, dB. */
  public VehicleBuilder tightBand(Double value) {
    tightBand = value;
    return this;
  }

  /** Sets the settings of the whole tree. */
  public VehicleBuilder settings(Settings value) {
    settings = value;
    return this;
  }

  /** Sets the operating conditions. */
  public VehicleBuilder conditions(List<OperatingCondition> value) {
    conditions = value;
    return this;
  }

  /** Sets the zones. */
  public VehicleBuilder zones(List<Zone> value) {
    zones = value;
    return this;
  }

  /** Sets the apertures. */
  public VehicleBuilder apertures(List<Aperture> value) {
    apertures = value;
    return this;
  }

  /** Sets the receivers. */
  public VehicleBuilder receivers(List<Receiver> value) {
    receivers = value;
    return this;
  }

  /** Sets the constructions. */
  public VehicleBuilder constructions(List<Construction> value) {
    constructions = value;
    return this;
  }

  /** Sets the lay-ups. */
  public VehicleBuilder layUps(List<LayUp> value) {
    layUps = value;
    return this;
  }

  /** Sets the suppliers. */
  public VehicleBuilder suppliers(List<Supplier> value) {
    suppliers = value;
    return this;
  }

  /** Sets the other sources. */
  public VehicleBuilder otherSources(List<OtherSource> value) {
    otherSources = value;
    return this;
  }

  /** Sets the targets. */
  public VehicleBuilder targets(List<Target> value) {
    targets = value;
    return this;
  }

  /** Sets the allowances. */
  public VehicleBuilder allowances(List<Allowance> value) {
    allowances = value;
    return this;
  }

  /** Sets the sections and panels. */
  public VehicleBuilder tree(List<Node> value) {
    tree = value;
    return this;
  }

  /** Sets the change log. */
  public VehicleBuilder changeLog(List<ChangeEntry> value) {
    changeLog = value;
    return this;
  }

  /** Sets the unknown properties. */
  public VehicleBuilder extras(Extras value) {
    extras = value;
    return this;
  }

  /** The record. */
  public Vehicle build() {
    return new Vehicle(
        id,
        name,
        description,
        tightBand,
        settings,
        conditions,
        zones,
        apertures,
        receivers,
        constructions,
        layUps,
        suppliers,
        otherSources,
        targets,
        allowances,
        tree,
        changeLog,
        extras);
  }
}
