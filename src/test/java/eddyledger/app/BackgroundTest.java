package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Computing beside the event thread: the newest vehicle wins, cancelling stops, faults are told.
 */
class BackgroundTest {
  private final Projects projects = new Projects(new ProjectReader());
  private final BlockingQueue<ComputedLedger> results = new LinkedBlockingQueue<>();
  private final List<String> heard = new ArrayList<>();
  private Background background;

  private Background background(FaultReport faults) {
    background =
        new Background(
            new Computation(projects),
            faults,
            Runnable::run,
            results::add,
            (steps, of) -> {
              synchronized (heard) {
                heard.add(steps + " of " + of);
              }
            });
    return background;
  }

  @AfterEach
  void close() {
    background.close();
  }

  private Vehicle example() {
    return projects.open(Path.of("examples", "quillon-82.eddyledger")).vehicle().orElseThrow();
  }

  private ComputedLedger next() throws InterruptedException {
    ComputedLedger result = results.poll(60, TimeUnit.SECONDS);
    assertThat(result).as("a result within a minute").isNotNull();
    return result;
  }

  @Test
  void theNewestVehicleIsComputedAndOlderOnesAreNot() throws InterruptedException {
    Background running = background(new FaultReport());
    Vehicle vehicle = example();
    for (long revision = 1; revision <= 20; revision++) {
      running.request(revision, vehicle);
    }
    ComputedLedger result = next();
    while (result.revision() < 20) {
      result = next();
    }
    assertThat(result.ledger()).isPresent();
    assertThat(result.findings()).hasSize(6);
    assertThat(results).isEmpty();
    assertThat(heard).last().asString().matches("(\\d+) of \\1");
    assertThat(running.busy()).isFalse();
  }

  @Test
  void aCancelledRunGivesNothing() throws InterruptedException {
    Background running = background(new FaultReport());
    running.request(1, example());
    running.cancel();
    assertThat(running.busy()).isFalse();
    running.request(2, example());
    assertThat(next().revision()).isEqualTo(2);
    assertThat(results).isEmpty();
  }

  @Test
  void aVehicleThatCannotBeComputedGivesFindings() throws InterruptedException {
    background(new FaultReport()).request(7, NewVehicle.empty());
    ComputedLedger result = next();
    assertThat(result.ledger()).isEmpty();
    assertThat(result.findings()).isNotEmpty();
  }

  @Test
  void aFaultOfTheProgramBecomesAFindingWithItsReport(@TempDir Path folder)
      throws InterruptedException {
    background(new FaultReport(folder)).request(3, null);
    ComputedLedger result = next();
    assertThat(result.findings()).singleElement().matches(f -> f.code().equals("internal-fault"));
    assertThat(result.findings().get(0).remedy()).contains(folder.toString());
    assertThat(folder).isNotEmptyDirectory();
  }
}
