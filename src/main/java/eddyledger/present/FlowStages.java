package eddyledger.present;

import eddyledger.ledger.PictureCurves;
import eddyledger.model.AirGiven;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.LayerGiven;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Settings;
import eddyledger.present.StageSteps.Stage;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;

/** Writes the stages of the flow: ambient air, flow at the panel, boundary layer. */
final class FlowStages {
  private static final int POINTS = 41;
  private static final double KILO = 1000.0;

  private final TraceSource source;
  private final OperatingCondition condition;
  private final AirGiven air;

  FlowStages(TraceSource source) {
    this.source = source;
    condition = source.trace().condition();
    air = condition.outsideAir();
  }

  StageText ambient() {
    boolean standard = air.altitude() != null;
    double offset = air.temperatureOffset() == null ? 0.0 : air.temperatureOffset();
    String day =
        offset == 0.0
            ? "."
            : ", "
                + Readable.plain(Math.abs(offset))
                + (offset > 0.0 ? " K warmer" : " K colder")
                + " than the standard day.";
    String sentence =
        standard
            ? "Standard atmosphere at " + height(air.altitude()) + day
            : "Air as entered, by temperature and pressure.";
    boolean low = standard && air.altitude() <= 11.0 * KILO;
    String temperature = low ? "T = 288.15 − 6.5 h,  " : "T = 216.65 from 11 km up,  ";
    return new StageText(
        sentence,
        (standard ? "Altitude from condition " : "Air from condition ")
            + Readable.brief(condition.name()),
        (standard ? temperature : "") + "ρ = p/(R T),  c = √(γ R T)",
        "T = "
            + Readable.number(source.value("T"), 4)
            + " K,  p = "
            + Readable.pressure(source.value("p"))
            + ",  ρ = "
            + Readable.number(source.value("rho"), 3)
            + " kg/m³,  c = "
            + Readable.speed(source.value("c")),
        standard ? column(offset) : StagePicture.none("Air as entered"));
  }

  private static String height(double metres) {
    return Math.abs(metres) < KILO
        ? Readable.plain(metres) + " m"
        : Readable.plain(metres / KILO) + " km";
  }

  private StagePicture column(double offset) {
    double top = Math.min(20.0, Math.max(15.0, Math.ceil(air.altitude() / KILO))) * KILO;
    double[] altitudes =
        IntStream.range(0, POINTS).mapToDouble(i -> i * top / (POINTS - 1)).toArray();
    int here = (int) Math.round(air.altitude() / top * (POINTS - 1));
    altitudes[here] = air.altitude();
    double[] temperatures = PictureCurves.temperature(altitudes, offset);
    double least = Arrays.stream(temperatures).min().orElseThrow();
    double most = Arrays.stream(temperatures).max().orElseThrow();
    return new StagePicture(
        StagePicture.Kind.CURVES,
        Arrays.stream(altitudes).map(altitude -> altitude / KILO).toArray(),
        List.<double[]>of(temperatures),
        List.of(""),
        here,
        least - 0.3 * (most - least),
        most,
        "0 km",
        "temperature",
        Readable.plain(top / KILO) + " km");
  }

  StageText flow() {
    EdgeSpeed given = source.where().varying(Settings::localSpeed).orElseThrow();
    String value = Readable.plain(given.value().best());
    boolean mach = condition.mach() != null;
    String vehicle =
        mach
            ? "Mach " + Readable.plain(condition.mach())
            : Readable.plain(condition.speed()) + " m/s";
    String speed = Readable.speed(source.value("Ue"));
    String product =
        mach
            ? value
                + " · "
                + Readable.plain(condition.mach())
                + " · "
                + Readable.number(source.value("c"), 4)
            : value + " · " + Readable.plain(condition.speed());
    String sentence =
        switch (given.way()) {
          case SPEED -> "Local flow speed " + value + " m/s as given.";
          case RATIO -> vehicle + " times the local speed ratio " + value + ".";
          case PRESSURE_COEFFICIENT -> vehicle + " at the pressure coefficient " + value + ".";
          case PRESSURE_COEFFICIENT_INCOMPRESSIBLE ->
              vehicle + " at the pressure coefficient " + value + ", incompressible.";
        };
    String rule =
        switch (given.way()) {
          case SPEED -> "U_{e} as given";
          case RATIO -> mach ? "U_{e} = k M c" : "U_{e} = k U";
          case PRESSURE_COEFFICIENT -> "U_{e} from c_{p}, isentropic";
          case PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> "U_{e} = U √(1 − c_{p})";
        };
    String worked = given.way() == EdgeSpeed.Way.RATIO ? product + " = " : "";
    String what =
        switch (given.way()) {
          case SPEED -> "local speed ";
          case RATIO -> "ratio ";
          case PRESSURE_COEFFICIENT, PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> "coefficient ";
        };
    return new StageText(
        sentence,
        (mach ? "Mach" : "Speed")
            + " from "
            + Readable.brief(condition.name())
            + "; "
            + what
            + source.where().ofVarying(Settings::localSpeed)
            + PathStages.graded(given.value().evidence()),
        rule + ",  M_{e} = U_{e}/c_{e},  q = ½ ρ_{e} U_{e}^{2}",
        "U_{e} = "
            + worked
            + speed
            + ",  M_{e} = "
            + Readable.number(source.value("Me"), 3)
            + ",  q = "
            + Readable.pressure(source.value("q")),
        LocalSpeeds.picture(source.ledger(), source.trace()));
  }

  StageText layer() {
    List<String> given = given(source.where().varying(Settings::boundaryLayer).orElseThrow());
    boolean rest =
        source.steps().of(Stage.LAYER).stream().anyMatch(it -> it.note().contains("filled in"));
    return new StageText(
        Readable.capital(String.join(", ", given))
            + (rest ? "; the rest is worked out from it." : ", all of it as given."),
        "Boundary layer " + source.where().ofVarying(Settings::boundaryLayer),
        "H = δ*/θ,  u_{τ} = √(τ_{w}/ρ_{w})",
        "δ = "
            + Readable.length(source.value("delta"))
            + ",  δ* = "
            + Readable.length(source.value("delta*"))
            + ",  τ_{w} = "
            + Readable.pressure(source.value("tau_w"))
            + ",  u_{τ} = "
            + Readable.number(source.value("u_tau"), 3)
            + " m/s",
        profile());
  }

  private static List<String> given(LayerGiven layer) {
    List<String> given = new ArrayList<>();
    if (layer.runningLength() != null) {
      given.add("running length " + Readable.length(layer.runningLength().best()));
    }
    if (layer.thickness() != null) {
      given.add("thickness " + Readable.length(layer.thickness().best()));
    }
    if (layer.displacementThickness() != null) {
      given.add("displacement thickness " + Readable.length(layer.displacementThickness().best()));
    }
    if (layer.momentumThickness() != null) {
      given.add("momentum thickness " + Readable.length(layer.momentumThickness().best()));
    }
    if (layer.wallShear() != null) {
      given.add("wall shear stress " + Readable.pressure(layer.wallShear().best()));
    }
    return given;
  }

  /** A power law of the layer's shape factor, (y/δ)^((H−1)/2): a sketch, used for nothing else. */
  private StagePicture profile() {
    double thickness = source.value("delta");
    double speed = source.value("Ue");
    double exponent = 0.5 * (source.value("H") - 1.0);
    double[] speeds = new double[POINTS];
    double[] heights = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      double part = (double) i / (POINTS - 1);
      // close points at the wall, where the speed rises steeply
      heights[i] = thickness * part * part;
      speeds[i] = speed * Math.pow(part * part, exponent);
    }
    double[] lines = {thickness, source.value("delta*")};
    return new StagePicture(
        StagePicture.Kind.PROFILE,
        speeds,
        List.<double[]>of(heights, lines),
        List.of("δ " + Readable.length(thickness), "δ* " + Readable.length(source.value("delta*"))),
        -1,
        0.0,
        thickness * 1.25,
        "0",
        "speed",
        Readable.number(speed, 3) + " m/s");
  }
}
