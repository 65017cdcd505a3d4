package eddyledger.file;

import eddyledger.model.AirGiven;
import eddyledger.model.Allowance;
import eddyledger.model.Aperture;
import eddyledger.model.ByCondition;
import eddyledger.model.ChangeEntry;
import eddyledger.model.Evidence;
import eddyledger.model.EvidenceGrade;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Receiver;
import eddyledger.model.Supplier;
import eddyledger.model.Target;
import eddyledger.model.ValueKind;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.time.Instant;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A vehicle that uses every property of the file in every form, with unknown properties wherever
 * they can stand. It passes every check.
 */
final class RichVehicle {
  private RichVehicle() {}

  static Vehicle vehicle() {
    return VehicleBuilder.named("demo-vehicle", "Überlandwagen „Möwe“ 車両 🚄")
        .description("=1+1 is text here, and so is @this\nand this \u0007 \\ \"quoted\" \uD83D.")
        .tightBand(0.75)
        .settings(RichTree.vehicleSettings())
        .conditions(conditions())
        .zones(zones())
        .apertures(
            List.of(
                new Aperture(
                    "door", "+door", "front", "rear", 1.25, RichValues.octaves(), extras("door")),
                new Aperture("passage", "passage", "rear", "front", 0.5, null, Extras.NONE)))
        .receivers(
            List.of(
                new Receiver(
                    "driver-ear",
                    "driver's ear",
                    "front",
                    List.of(new Receiver.DirectPath("front-window", 0.8, extras("direct"))),
                    extras("receiver")),
                new Receiver("rear-seat", "rear seat", "rear", List.of(), Extras.NONE)))
        .constructions(RichParts.constructions())
        .layUps(RichParts.layUps())
        .suppliers(List.of(new Supplier("glass-works", "Glass & Söhne", extras("supplier"))))
        .otherSources(
            List.of(
                new OtherSource(
                    "tyres",
                    "tyres",
                    "driver-ear",
                    "cruise",
                    RichValues.thirds(40.0),
                    extras("tyres"))))
        .targets(targets())
        .allowances(
            List.of(
                new Allowance(
                    "roof",
                    "driver-ear",
                    "cruise",
                    55.5,
                    evidence("agreed on the phone"),
                    extras("allowance"))))
        .tree(RichTree.tree())
        .changeLog(
            List.of(
                new ChangeEntry(
                    Instant.parse("2026-02-28T23:59:59.123Z"),
                    "A. Lead",
                    "front-window",
                    "4 mm",
                    "5 mm",
                    "-too light",
                    "Glass & Söhne",
                    extras("change")),
                new ChangeEntry(
                    Instant.parse("2026-03-01T08:00:00Z"),
                    "B. Lead",
                    "tyres entered",
                    null,
                    null,
                    "measured",
                    null,
                    Extras.NONE)))
        .extras(rootExtras())
        .build();
  }

  private static List<OperatingCondition> conditions() {
    AirGiven ground = new AirGiven(null, null, 293.15, 101325.0, extras("air"));
    AirGiven high = new AirGiven(11000.0, -5.5, null, null, Extras.NONE);
    return List.of(
        new OperatingCondition(
            "cruise",
            "cruise",
            38.9,
            null,
            ground,
            new AirGiven(2400.0, null, null, null, extras("cabin air")),
            10.0,
            -2.5,
            280.0,
            285.25,
            true,
            extras("condition")),
        new OperatingCondition(
            "climb.2", "climb", null, 0.78, high, null, null, null, null, null, false, Extras.NONE),
        new OperatingCondition(
            "rest", "rest", 20.0, null, ground, null, null, null, null, null, null, Extras.NONE));
  }

  private static List<Zone> zones() {
    return List.of(
        new Zone(
            "front",
            "front zone",
            2.5,
            11.0,
            new ByCondition<>(
                RichValues.thirds(1.0),
                Map.of("cruise", RichValues.single(), "climb.2", RichValues.octaves())),
            extras("zone")),
        new Zone("rear", "rear zone", null, null, RichValues.plain(0.9), Extras.NONE),
        new Zone(
            "store",
            "store",
            1.0e-2,
            null,
            new ByCondition<>(
                null,
                Map.of(
                    "cruise",
                    RichValues.single(),
                    "climb.2",
                    RichValues.octaves(),
                    "rest",
                    RichValues.thirds(2.0))),
            Extras.NONE));
  }

  private static List<Target> targets() {
    PassRule rule = new PassRule(PassRule.Rounding.TENTH, 0.5, PassRule.Across.ENERGY_MEAN);
    return List.of(
        new Target(
            "driver-at-cruise",
            "driver at cruise",
            "cruise",
            List.of("driver-ear", "rear-seat"),
            Rating.OVERALL_A,
            66.0,
            1.5,
            rule,
            evidence("contract"),
            new Extras(Map.of("x-note", "target", "pass_rule", Map.of("x-by", "both")))),
        new Target(
            "speech",
            "speech",
            "climb.2",
            List.of("rear-seat"),
            Rating.SIL_500_4K,
            58.25,
            0.0,
            PassRule.PLAIN,
            Evidence.NONE,
            Extras.NONE));
  }

  static Evidence evidence(String source) {
    return new Evidence(EvidenceGrade.FLAT_SAMPLE, ValueKind.OFFERED, source);
  }

  static Judged judged(double best) {
    return new Judged(best, best * 0.9, best * 1.1, evidence("=HYPERLINK"), extras("judged"));
  }

  /** Unknown properties of one text. */
  static Extras extras(String note) {
    return new Extras(Map.of("x-note", note));
  }

  private static Extras rootExtras() {
    Map<String, Object> extras = new LinkedHashMap<>();
    extras.put("vehicle", Map.of("x-owner", "works", "x-settings of later", List.of(1, 2)));
    extras.put("x-null", null);
    extras.put("x-numbers", Arrays.asList(1, 5_000_000_000L, 0.1, 17.0, 1.0e-7, null));
    extras.put("x-exact", new BigDecimal("0.10000000000000000000000000000000001"));
    extras.put("x-huge", new BigInteger("123456789012345678901234567890"));
    extras.put("x-beyond", new BigDecimal("1E+999"));
    extras.put("x-flags", List.of(true, false));
    extras.put("x-deep", Map.of("a", List.of(Map.of("b", List.of())), "c", Map.of()));
    extras.put("x-", "nearly empty key");
    return new Extras(extras);
  }
}
