package eddyledger.present;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.Trace;
import eddyledger.model.TreePath;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * The account of one contribution as a reader follows it: stage by stage from the air outside to
 * the level at the receiver, in one followed band, and every number behind it.
 *
 * @param panelId id of the panel
 * @param conditionId id of the operating condition
 * @param receiverId id of the receiver
 * @param title whose contribution
 * @param subtitle heard where, in which condition, what comes out or that there is no value
 * @param band the followed band, 0 .. 27
 * @param stages the stages; empty if there is no value
 * @param axis the axis of the running level
 * @param total all bands together
 * @param numbers every number of the trace
 * @param reason why there is no value, or what is missing; empty if nothing
 */
public record TraceAccount(
    String panelId,
    String conditionId,
    String receiverId,
    String title,
    String subtitle,
    int band,
    List<TraceStage> stages,
    LevelAxis axis,
    TraceTotal total,
    List<TraceNumber> numbers,
    String reason) {
  /** The band that is followed where nobody has chosen one: 1 kHz. */
  public static final int FIRST_BAND = Bands.position("1000");

  public TraceAccount {
    stages = List.copyOf(stages);
    numbers = List.copyOf(numbers);
  }

  /**
   * The account of a panel's contribution.
   *
   * @param band the followed band, 0 .. 27
   * @return empty if there is no such panel, condition or receiver
   */
  public static Optional<TraceAccount> of(
      Ledger ledger, String panelId, String conditionId, String receiverId, int band) {
    Optional<Trace> trace = ledger.trace(panelId, conditionId, receiverId);
    Optional<TreePath> path =
        TreePath.of(ledger.vehicle()).stream()
            .filter(it -> it.node().id().equals(panelId))
            .findFirst();
    return trace.flatMap(
        found -> path.map(place -> new AccountBuilder(ledger, found, place, band).account()));
  }

  /**
   * The band in which a panel's A-weighted level is highest: the one to follow first.
   *
   * @return 0 .. 27; {@link #FIRST_BAND} if no band has a value
   */
  public static int loudestBand(
      Ledger ledger, String panelId, String conditionId, String receiverId) {
    return ledger
        .trace(panelId, conditionId, receiverId)
        .filter(Trace::hasValue)
        .map(AccountBuilder::loudest)
        .orElse(FIRST_BAND);
  }

  /** Names of the bands that can be followed, by position. */
  public static List<String> bandNames() {
    return IntStream.range(0, Bands.COUNT).mapToObj(Readable::band).toList();
  }

  /** Name of the followed band. */
  public String bandName() {
    return Readable.band(band);
  }

  /** Whether there is a value to account for. */
  public boolean hasValue() {
    return !stages.isEmpty();
  }

  /** The whole account as plain text, for the clipboard. */
  public String text() {
    return AccountText.of(this);
  }
}
