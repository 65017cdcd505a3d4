package eddyledger.ledger;

import eddyledger.model.Aperture;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.physics.cabin.ReceiverTransfer;
import eddyledger.physics.cabin.Sabine;
import eddyledger.physics.cabin.ZoneBalance;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * How the cabin answers in one condition: mean-square pressure at a receiver per watt that a panel
 * radiates into a zone, per band. Bands in which a zone's absorption or an aperture's transmission
 * loss is missing are NaN.
 */
final class CabinResponse {
  private final Map<String, Integer> zones = new HashMap<>();
  private final BandSpectrum[] absorption;
  private final Double[] surface;
  private final ZoneBalance[] balances = new ZoneBalance[Bands.COUNT];
  private final double[][][] diffuse;
  private final double impedance;

  /**
   * Balances the zones.
   *
   * @throws IllegalArgumentException if a zone has no absorption
   */
  CabinResponse(Vehicle vehicle, ResolvedCondition condition) {
    impedance = condition.cabin().characteristicImpedance();
    int count = vehicle.zones().size();
    absorption = new BandSpectrum[count];
    surface = new Double[count];
    for (int z = 0; z < count; z++) {
      Zone zone = vehicle.zones().get(z);
      zones.put(zone.id(), z);
      absorption[z] = zone.absorptionArea().in(condition.id()).best().spectrum();
      surface[z] = zone.innerSurface();
    }
    for (int band = 0; band < Bands.COUNT; band++) {
      balances[band] = balance(vehicle, band);
    }
    diffuse = diffuse(count);
  }

  /** Pa²/W between zones, shape [receiving zone][source zone][28]. */
  private double[][][] diffuse(int count) {
    double[][][] all = new double[count][count][Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      for (int r = 0; r < count; r++) {
        for (int z = 0; z < count; z++) {
          all[r][z][band] =
              balances[band] == null
                  ? Double.NaN
                  : new ReceiverTransfer(balances[band], r).diffuse(z);
        }
      }
    }
    return all;
  }

  private ZoneBalance balance(Vehicle vehicle, int band) {
    double[] areas = new double[absorption.length];
    for (int z = 0; z < areas.length; z++) {
      areas[z] = absorption[z].value(band);
    }
    List<ZoneBalance.Coupling> couplings = new ArrayList<>();
    boolean complete = Arrays.stream(areas).noneMatch(Double::isNaN);
    for (Aperture aperture : vehicle.apertures()) {
      double loss =
          aperture.transmissionLoss() == null
              ? 0.0
              : aperture.transmissionLoss().best().spectrum().value(band);
      complete &= !Double.isNaN(loss);
      couplings.add(
          new ZoneBalance.Coupling(
              zones.get(aperture.firstZone()),
              zones.get(aperture.secondZone()),
              aperture.area() * Decibels.ratio(-loss)));
    }
    return complete ? new ZoneBalance(areas, couplings, impedance) : null;
  }

  /**
   * Pa² at a receiver per watt from one piece of a panel, shape [28].
   *
   * @param receiver the receiver
   * @param zone id of the zone the panel radiates into
   * @param panel id of the panel
   * @param area area of one piece, m²; NaN where unknown, which takes the direct sound away
   */
  double[] perWatt(Receiver receiver, String zone, String panel, double area) {
    int from = zones.get(zone);
    int at = zones.get(receiver.zone());
    double distance = distance(receiver, zone, panel, area);
    double[] perWatt = diffuse[at][from].clone();
    if (Double.isNaN(distance)) {
      return perWatt;
    }
    for (int band = 0; band < Bands.COUNT; band++) {
      if (balances[band] != null) {
        double absorbed = Math.min(1.0, meanAbsorption(zone, band));
        perWatt[band] =
            new ReceiverTransfer(balances[band], at).withDirect(absorbed, area, distance);
      }
    }
    return perWatt;
  }

  /**
   * Distance in m at which a panel's direct sound is counted; NaN if it is not: no distance is
   * given, the panel radiates into another zone, or the zone's inner surface is unknown.
   */
  double distance(Receiver receiver, String zone, String panel, double area) {
    boolean possible =
        zone.equals(receiver.zone()) && surface[zones.get(zone)] != null && !Double.isNaN(area);
    return receiver.direct().stream()
        .filter(path -> possible && path.panel().equals(panel))
        .mapToDouble(Receiver.DirectPath::distance)
        .findFirst()
        .orElse(Double.NaN);
  }

  /**
   * Mean absorption coefficient of a zone in a band; NaN where unknown, above 1 where absorption
   * and surface do not belong together.
   */
  double meanAbsorption(String zone, int band) {
    int z = zones.get(zone);
    return surface[z] == null
        ? Double.NaN
        : Sabine.meanAbsorption(absorption[z].value(band), surface[z]);
  }

  /** Absorption area of a zone, m² per band. */
  BandSpectrum absorption(String zone) {
    return absorption[zones.get(zone)];
  }

  /** Characteristic impedance of the cabin's air, Pa s/m. */
  double impedance() {
    return impedance;
  }
}
