package eddyledger.bench;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Arrays;

/**
 * The workbook against the bare library in turns, so that other load on the machine meets both
 * alike: medians of wall and processor time, and their ratios. Argument: rounds, 7 if none.
 *
 * <p>{@code mvn -q test-compile exec:java -Dexec.classpathScope=test
 * -Dmain.class=eddyledger.bench.WorkbookRatio -Dexec.args=7}
 */
final class WorkbookRatio {
  private static final int[] SIZES = {45, 300, 2000};
  private static final double NANOS_A_MILLI = 1.0e6;
  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

  private WorkbookRatio() {}

  /** Something that writes a workbook. */
  private interface Writing {
    byte[] write() throws IOException;
  }

  public static void main(String[] arguments) throws IOException {
    int rounds = arguments.length == 0 ? 7 : Integer.parseInt(arguments[0]);
    System.out.println("panels  ours_ms  bare_ms  ratio  ours_cpu_ms  bare_cpu_ms  ratio");
    for (int size : SIZES) {
      compare(size, rounds);
    }
  }

  private static void compare(int size, int rounds) throws IOException {
    WorkbookBench bench = new WorkbookBench();
    bench.panels = size;
    bench.prepare();
    double[][] ours = new double[2][rounds];
    double[][] bare = new double[2][rounds];
    for (int i = -2; i < rounds; i++) {
      double[] first = time(bench::budget);
      double[] second = time(bench::bareLibrary);
      for (int kind = 0; kind < 2 && i >= 0; kind++) {
        ours[kind][i] = first[kind];
        bare[kind][i] = second[kind];
      }
    }
    System.out.printf(
        "%6d  %7.0f  %7.0f  %5.2f  %11.0f  %11.0f  %5.2f%n",
        size,
        median(ours[0]),
        median(bare[0]),
        median(ours[0]) / median(bare[0]),
        median(ours[1]),
        median(bare[1]),
        median(ours[1]) / median(bare[1]));
  }

  /** Wall and processor time of one writing, milliseconds. */
  private static double[] time(Writing writing) throws IOException {
    long wall = System.nanoTime();
    long processor = THREADS.getCurrentThreadCpuTime();
    writing.write();
    return new double[] {
      (System.nanoTime() - wall) / NANOS_A_MILLI,
      (THREADS.getCurrentThreadCpuTime() - processor) / NANOS_A_MILLI
    };
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
