package eddyledger.model;

import java.util.List;

/**
 * Everything the lead describes about one vehicle.
 *
 * @param id identity
 * @param name name shown
 * @param description a sentence or two; null if none
 * @param tightBand margin below which a state is tight, dB; null for {@link #DEFAULT_TIGHT_BAND}
 * @param settings what holds in the whole tree unless set again
 * @param conditions operating conditions
 * @param zones zones of the cabin
 * @param apertures what couples the zones
 * @param receivers places where levels are wanted
 * @param constructions constructions that panels refer to
 * @param layUps lay-ups that panels refer to
 * @param suppliers suppliers that panels refer to
 * @param otherSources contributions that are not flow
 * @param targets targets
 * @param allowances allowances entered by hand
 * @param tree sections and panels, in order
 * @param changeLog change log, oldest first
 * @param extras unknown properties
 */
public record Vehicle(
    String id,
    String name,
    String description,
    Double tightBand,
    Settings settings,
    List<OperatingCondition> conditions,
    List<Zone> zones,
    List<Aperture> apertures,
    List<Receiver> receivers,
    List<Construction> constructions,
    List<LayUp> layUps,
    List<Supplier> suppliers,
    List<OtherSource> otherSources,
    List<Target> targets,
    List<Allowance> allowances,
    List<Node> tree,
    List<ChangeEntry> changeLog,
    Extras extras) {
  /** Margin in dB below which a state is tight, where the vehicle states none. */
  public static final double DEFAULT_TIGHT_BAND = 1.0;

  public Vehicle {
    conditions = List.copyOf(conditions);
    zones = List.copyOf(zones);
    apertures = List.copyOf(apertures);
    receivers = List.copyOf(receivers);
    constructions = List.copyOf(constructions);
    layUps = List.copyOf(layUps);
    suppliers = List.copyOf(suppliers);
    otherSources = List.copyOf(otherSources);
    targets = List.copyOf(targets);
    allowances = List.copyOf(allowances);
    tree = List.copyOf(tree);
    changeLog = List.copyOf(changeLog);
  }

  /** The tight band that holds, dB. */
  public double tightBandOrDefault() {
    return tightBand == null ? DEFAULT_TIGHT_BAND : tightBand;
  }

  /** A changeable copy. */
  public VehicleBuilder edit() {
    return new VehicleBuilder(this);
  }
}
