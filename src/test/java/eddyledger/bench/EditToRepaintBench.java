package eddyledger.bench;

import eddyledger.window.EditTimes;
import eddyledger.window.MeasuredWindow;
import java.awt.AWTException;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.function.ToLongFunction;
import java.util.prefs.BackingStoreException;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;

/**
 * From the press of a key in a field of the sheet until everything is painted, on the program's own
 * window with two receivers and three conditions. The digit typed makes another value every time,
 * so that nothing of the panel is known beforehand. JMH counts until everything is painted; the
 * table printed at the end tells when the panel's own row had its new level, and what came before.
 * Needs a display with a window manager, and its keyboard meanwhile.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 10)
@Measurement(iterations = 3, time = 10)
public class EditToRepaintBench {
  private static final String PANEL = "panel-3";

  /** Fields with the text that stands there and the place where a digit is typed. */
  public enum Field {
    /** Thickness, mm: the resonances change. */
    THICKNESS("sheet.thickness", "3.1", 2, KeyEvent.VK_9),
    /** Length, m: resonances and radiation change. */
    LENGTH("sheet.length", "0.3", 2, KeyEvent.VK_7),
    /** Loss factor: neither changes. */
    LOSS_FACTOR("sheet.lossFactor", "0.01", 3, KeyEvent.VK_9);

    private final String name;
    private final String text;
    private final int caret;
    private final int key;

    Field(String name, String text, int caret, int key) {
      this.name = name;
      this.text = text;
      this.caret = caret;
      this.key = key;
    }
  }

  /** Panels of the vehicle. */
  @Param({"200"})
  public int panels;

  /** Where the key is pressed. */
  @Param({"THICKNESS", "LENGTH", "LOSS_FACTOR"})
  public Field field;

  private final List<EditTimes> times = new ArrayList<>();
  private MeasuredWindow window;
  private int round;

  /** Opens the window. */
  @Setup
  public void open() throws IOException, AWTException {
    window = new MeasuredWindow(MadeUpVehicle.of(panels), PANEL);
  }

  /** Forgets what was measured while warming up. */
  @Setup(Level.Iteration)
  public void begin() {
    times.clear();
  }

  /** Lets another value stand in the field. */
  @Setup(Level.Invocation)
  public void stand() {
    round++;
    window.stand(field.name, field.text + String.format("%04d", round), field.caret);
  }

  /** Types a digit. */
  @Benchmark
  public EditTimes digit() throws InterruptedException {
    EditTimes measured = window.press(field.key);
    times.add(measured);
    return measured;
  }

  /** Says where the time went in the last iteration. */
  @TearDown(Level.Iteration)
  public void tell() {
    System.out.printf("%n  %d samples, ms from the press      median     p95%n", times.size());
    line("changed, marked as older", EditTimes::edited);
    line("new ledger handed over", EditTimes::delivered);
    line("taken by the views", EditTimes::presented);
    line("own row painted", EditTimes::row);
    line("everything painted", EditTimes::all);
    line("(event thread meanwhile)", EditTimes::paintedMeanwhile);
  }

  private void line(String words, ToLongFunction<EditTimes> time) {
    long[] sorted = times.stream().mapToLong(time).sorted().toArray();
    System.out.printf(
        "  %-34s %8.1f %8.1f%n",
        words,
        sorted[sorted.length / 2] / 1.0e6,
        sorted[(int) Math.min(sorted.length - 1L, Math.round(sorted.length * 0.95))] / 1.0e6);
  }

  /** Closes the window. */
  @TearDown
  public void close() throws IOException, BackingStoreException {
    window.close();
  }
}
