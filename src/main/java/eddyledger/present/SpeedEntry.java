package eddyledger.present;

import eddyledger.app.Slot;
import eddyledger.check.Limit;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.EdgeSpeed.Way;
import eddyledger.model.Extras;
import eddyledger.model.Held;
import eddyledger.model.Judged;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;

/**
 * The local flow speed. Its unit says in which way it is given: as a ratio to the vehicle's speed,
 * as a speed, or by the pressure coefficient; a unit typed behind the number changes the way.
 */
final class SpeedEntry extends SlotEntry<EdgeSpeed> {
  /** Its stable name. */
  static final String KEY = "localSpeed";

  private static final int SIGNIFICANT = 6;
  private static final Quantity QUANTITY = Quantity.LOCAL_SPEED;

  SpeedEntry(Slot<EdgeSpeed> slot) {
    super(KEY, "Local speed", "local speed", slot, "local_speed");
  }

  private static Way way(Unit unit) {
    return switch (unit) {
      case TIMES_SPEED -> Way.RATIO;
      case PRESSURE_COEFFICIENT -> Way.PRESSURE_COEFFICIENT;
      case PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> Way.PRESSURE_COEFFICIENT_INCOMPRESSIBLE;
      default -> Way.SPEED;
    };
  }

  private static Unit usual(Way way) {
    return switch (way) {
      case RATIO -> Unit.TIMES_SPEED;
      case SPEED -> Unit.METRE_PER_SECOND;
      case PRESSURE_COEFFICIENT -> Unit.PRESSURE_COEFFICIENT;
      case PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> Unit.PRESSURE_COEFFICIENT_INCOMPRESSIBLE;
    };
  }

  private static Limit limit(Way way) {
    return switch (way) {
      case SPEED -> Limit.SPEED;
      case RATIO -> Limit.SPEED_RATIO;
      case PRESSURE_COEFFICIENT, PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> Limit.PRESSURE_COEFFICIENT;
    };
  }

  private Optional<EdgeSpeed> held(Vehicle vehicle) {
    return slot().read(vehicle).map(Held::value);
  }

  /** The unit asked for, or that of the way it is given in. */
  private Unit unit(SheetContext context, Optional<EdgeSpeed> held) {
    Unit asked = context.units().get(key());
    return asked != null ? asked : held.map(it -> usual(it.way())).orElse(Unit.TIMES_SPEED);
  }

  @Override
  SheetField show(SheetContext context) {
    Optional<EdgeSpeed> held = held(context.vehicle());
    Unit unit = unit(context, held);
    FieldBuilder field = mark(new FieldBuilder(this, Kind.NUMBER), context).unit(unit, QUANTITY);
    if (held.isPresent() && way(unit) != held.get().way()) {
      String now = text(held.get(), usual(held.get().way()));
      return field
          .message(
              SheetMessage.warning(
                  "Type it in " + unit.symbol() + "; until then " + now + " holds."))
          .build();
    }
    held.ifPresent(
        speed -> {
          field.text(NumberText.text(speed.value().best(), QUANTITY, unit));
          boolean own = slot().read(context.vehicle()).map(Held::own).orElse(false);
          if (own) {
            JudgedNumber.range(speed.value(), QUANTITY, unit)
                .ifPresent(range -> NumberEntry.doubt(field, range));
          }
        });
    return field.build();
  }

  private static String text(EdgeSpeed speed, Unit unit) {
    return NumberText.text(speed.value().best(), QUANTITY, unit) + " " + unit.symbol();
  }

  @Override
  String words(SheetContext context, Optional<Held<EdgeSpeed>> held) {
    return held.map(it -> text(it.value(), usual(it.value().way()))).orElse("");
  }

  @Override
  Outcome take(SheetContext context, String text) {
    Unit shown = unit(context, held(context.vehicle()));
    NumberText.Read read = NumberText.read(text, QUANTITY, shown);
    if (!read.ok()) {
      return new Outcome.Refusal(read.fault());
    }
    Way way = way(read.unit());
    if (!limit(way).holds(read.value())) {
      return new Outcome.Refusal(
          Words.sentence(limit(way).what(read.value())) + " " + limit(way).remedy());
    }
    return new Outcome.Change(vehicle -> write(vehicle, way, read.value()));
  }

  private Vehicle write(Vehicle vehicle, Way way, double number) {
    Judged old =
        slot()
            .read(vehicle)
            .filter(held -> held.own() && held.value().way() == way)
            .map(held -> held.value().value())
            .orElse(null);
    Judged value =
        old == null
            ? Judged.of(number)
            : new Judged(number, old.low(), old.high(), old.evidence(), old.extras());
    Extras extras = held(vehicle).map(EdgeSpeed::extras).orElse(Extras.NONE);
    return slot().write(vehicle, new EdgeSpeed(way, value, extras));
  }

  /** Gives it in another way, with the speed the ledger found; else it has to be typed. */
  @Override
  Outcome unit(SheetContext context, Unit unit) {
    Optional<EdgeSpeed> held = held(context.vehicle());
    Way way = way(unit);
    double edge = context.traced("Ue");
    double vehicleSpeed = context.traced("U");
    boolean known = held.isPresent() && !context.stale() && !Double.isNaN(edge);
    if (held.isEmpty() || held.get().way() == way || !known) {
      return new Outcome.Nothing();
    }
    double number =
        switch (way) {
          case SPEED -> edge;
          case RATIO -> edge / vehicleSpeed;
          default -> Double.NaN;
        };
    if (Double.isNaN(number)) {
      return new Outcome.Nothing();
    }
    double rounded = new BigDecimal(number).round(new MathContext(SIGNIFICANT)).doubleValue();
    return new Outcome.Change(vehicle -> write(vehicle, way, rounded));
  }

  @Override
  boolean fits(SheetContext context, Unit unit) {
    return held(context.vehicle()).map(it -> it.way() == way(unit)).orElse(true);
  }

  @Override
  Outcome link(SheetContext context) {
    return held(context.vehicle())
        .map(
            it -> {
              Judged value = it.value();
              Judged bare = new Judged(value.best(), null, null, value.evidence(), value.extras());
              return new EdgeSpeed(it.way(), bare, it.extras());
            })
        .<Outcome>map(bare -> new Outcome.Change(vehicle -> slot().write(vehicle, bare)))
        .orElse(new Outcome.Nothing());
  }
}
