package eddyledger.present;

import eddyledger.app.PartSlot;
import eddyledger.app.VaryingSlot;
import eddyledger.check.Limit;
import eddyledger.ledger.ModelDefaults;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.Judged;
import eddyledger.model.Settings;
import eddyledger.model.Vehicle;
import eddyledger.model.WallPressureChoice;
import eddyledger.present.ChoiceEntry.ChoiceIn;
import eddyledger.present.NumberIn.Fallback;
import eddyledger.present.SheetField.Option;
import java.util.Arrays;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** Fields of the wall pressure: point spectrum, cross-spectrum and convection. */
final class WallPressureEntries {
  private static final int HIGHEST_ORDER = 5;
  private static final CrossSpectrumChoice DEFAULT = CrossSpectrumChoice.DEFAULT;

  private final String row;
  private final String condition;
  private final VaryingSlot<CrossSpectrumChoice> cross;

  WallPressureEntries(SheetContext context) {
    row = context.row();
    condition = context.selection().conditionId();
    cross =
        new VaryingSlot<>(
            row,
            condition,
            Settings::crossSpectrum,
            (it, value) -> it.edit().crossSpectrum(value).build());
  }

  /** All of them. */
  List<Entry> all() {
    return List.of(
        spectrum(),
        order(
            "orderAlong",
            "Order along",
            CrossSpectrumChoice::orderAlong,
            (it, order) -> it.at(order, it.orderAcross(), it.rule())),
        order(
            "orderAcross",
            "Order across",
            CrossSpectrumChoice::orderAcross,
            (it, order) -> it.at(it.orderAlong(), order, it.rule())),
        decay(
            "decayAlong",
            "Decay along",
            CrossSpectrumChoice::decayAlong,
            (it, rate) -> rates(it, rate, it.decayAcross())),
        decay(
            "decayAcross",
            "Decay across",
            CrossSpectrumChoice::decayAcross,
            (it, rate) -> rates(it, it.decayAlong(), rate)),
        rule(),
        convection());
  }

  private Entry spectrum() {
    VaryingSlot<WallPressureChoice> slot =
        new VaryingSlot<>(
            row,
            condition,
            Settings::wallPressure,
            (it, value) -> it.edit().wallPressure(value).build());
    return new ChoiceEntry<>(
        "spectrum",
        "Spectrum",
        "wall-pressure spectrum",
        slot,
        "wall_pressure",
        new ChoiceIn<>(
            WallPressureChoice::model,
            WallPressureEntries::chosen,
            vehicle ->
                ModelDefaults.spectra().stream().map(it -> new Option(it.id(), it.name())).toList(),
            ModelDefaults.spectrum()));
  }

  private static WallPressureChoice chosen(WallPressureChoice old, String id) {
    return old == null
        ? WallPressureChoice.of(id)
        : new WallPressureChoice(id, old.low(), old.high(), old.evidence(), old.extras());
  }

  private <T> PartSlot<CrossSpectrumChoice, T> part(
      Function<CrossSpectrumChoice, T> get,
      BiFunction<CrossSpectrumChoice, T, CrossSpectrumChoice> put) {
    return new PartSlot<>(cross, get, put, DEFAULT, WallPressureEntries::essence);
  }

  private static Object essence(CrossSpectrumChoice choice) {
    return Arrays.asList(
        choice.orderAlong(),
        choice.orderAcross(),
        choice.decayAlong(),
        choice.decayAcross(),
        choice.fittedOrderAlong(),
        choice.fittedOrderAcross(),
        choice.rule());
  }

  private Entry order(
      String key,
      String label,
      Function<CrossSpectrumChoice, Integer> get,
      BiFunction<CrossSpectrumChoice, Integer, CrossSpectrumChoice> put) {
    List<Option> orders =
        IntStream.rangeClosed(1, HIGHEST_ORDER)
            .mapToObj(it -> new Option(Integer.toString(it), Integer.toString(it)))
            .toList();
    String place = key.equals("orderAlong") ? "order_along" : "order_across";
    return new ChoiceEntry<>(
        key,
        label,
        label.replace("Order", "order of the cross-spectrum"),
        part(get, put),
        "cross_spectrum." + place,
        new ChoiceIn<>(
            order -> Integer.toString(order),
            (old, id) -> Integer.valueOf(id),
            (Vehicle vehicle) -> orders,
            Integer.toString(get.apply(DEFAULT))));
  }

  private Entry decay(
      String key,
      String label,
      Function<CrossSpectrumChoice, Judged> get,
      BiFunction<CrossSpectrumChoice, Judged, CrossSpectrumChoice> put) {
    Fallback otherwise = new Fallback(get.apply(DEFAULT).best(), "default", false);
    String place = key.equals("decayAlong") ? "decay_along" : "decay_across";
    return new NumberEntry<>(
        key,
        label,
        label.replace("Decay", "decay rate"),
        part(get, put),
        "cross_spectrum." + place,
        new JudgedNumber(Quantity.DECAY, Limit.DECAY, false, context -> otherwise));
  }

  private static CrossSpectrumChoice rates(CrossSpectrumChoice like, Judged along, Judged across) {
    return new CrossSpectrumChoice(
        like.orderAlong(),
        like.orderAcross(),
        along,
        across,
        like.fittedOrderAlong(),
        like.fittedOrderAcross(),
        like.rule(),
        like.evidence(),
        like.extras());
  }

  private Entry rule() {
    List<Option> rules =
        Stream.of(Rule.values())
            .map(it -> new Option(it.text(), Words.sentence(it.text().replaceFirst("-", " "))))
            .map(it -> new Option(it.id(), it.name().replace("Half power-", "Half-power ")))
            .toList();
    return new ChoiceEntry<>(
        "decayRule",
        "Decay rule",
        "decay rule",
        part(
            CrossSpectrumChoice::rule,
            (it, rule) -> it.at(it.orderAlong(), it.orderAcross(), rule)),
        "cross_spectrum.rule",
        new ChoiceIn<>(
            Rule::text,
            (old, id) ->
                Stream.of(Rule.values()).filter(it -> it.text().equals(id)).findFirst().orElse(old),
            (Vehicle vehicle) -> rules,
            DEFAULT.rule().text()));
  }

  private Entry convection() {
    Fallback otherwise = new Fallback(ModelDefaults.convectionRatio(), "default", false);
    return new NumberEntry<>(
        "convectionRatio",
        "Convection ratio",
        "convection ratio",
        new VaryingSlot<>(
            row,
            condition,
            Settings::convectionRatio,
            (it, value) -> it.edit().convectionRatio(value).build()),
        "convection_ratio",
        new JudgedNumber(Quantity.RATIO, Limit.CONVECTION_RATIO, false, context -> otherwise));
  }
}
