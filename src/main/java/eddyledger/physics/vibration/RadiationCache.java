package eddyledger.physics.vibration;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.CompletableFuture;

/**
 * Keeps radiation efficiencies by the size of the plate, up to a bound in bytes; the ones longest
 * unused go first. Passed to whoever computes panels, safe for any number of threads; two that need
 * the same block at once compute it once.
 *
 * <p>Checked by {@code RadiationTableTest}.
 */
public final class RadiationCache {
  private static final long LEAST_USUAL_BYTES = 256L << 20;
  private static final int USUAL_SHARE = 4;

  /**
   * What a block is known by.
   *
   * @param length a, m
   * @param width b, m
   * @param interval stretch of wavenumbers, or {@link WavenumberInterval#SINGLE}
   * @param wavenumber the single wavenumber, rad/m, else 0
   * @param modesAlong M
   * @param modesAcross N
   */
  record Key(
      double length,
      double width,
      int interval,
      double wavenumber,
      int modesAlong,
      int modesAcross) {}

  private record Entry(CompletableFuture<RadiationBlock> block, long bytes) {}

  private final GaussRules rules = new GaussRules();
  private final Map<Key, Entry> entries = new LinkedHashMap<>(64, 0.75f, true);
  private final long highestBytes;
  private long bytes;

  /**
   * With the usual bound: 256 MB, or a quarter of the memory the program may use if that is more.
   */
  public RadiationCache() {
    this(Math.max(LEAST_USUAL_BYTES, Runtime.getRuntime().maxMemory() / USUAL_SHARE));
  }

  /**
   * With a bound.
   *
   * @param highestBytes bytes kept at most, 0 or more; a block in use is not counted once dropped
   * @throws IllegalArgumentException if it is below 0
   */
  public RadiationCache(long highestBytes) {
    if (highestBytes < 0) {
      throw new IllegalArgumentException("bound must be 0 or more, not " + highestBytes);
    }
    this.highestBytes = highestBytes;
  }

  /**
   * The radiation efficiencies of one size of plate.
   *
   * @param length a, m, above 0
   * @param width b, m, above 0
   * @throws IllegalArgumentException if one is not above 0
   */
  public RadiationTable table(double length, double width) {
    return new RadiationTable(this, length, width);
  }

  /** Bytes kept now. */
  public synchronized long bytes() {
    return bytes;
  }

  RadiationBlock block(Key key, WavenumberInterval interval) {
    CompletableFuture<RadiationBlock> mine = new CompletableFuture<>();
    Entry entry = enter(key, new Entry(mine, RadiationBlock.bytes(key, interval)));
    if (entry.block() != mine) {
      return entry.block().join();
    }
    try {
      RadiationBlock block = RadiationBlock.of(rules, key, interval);
      mine.complete(block);
      return block;
    } catch (RuntimeException | Error e) {
      remove(key, entry);
      mine.completeExceptionally(e);
      throw e;
    }
  }

  private synchronized Entry enter(Key key, Entry fresh) {
    Entry known = entries.get(key);
    if (known != null) {
      return known;
    }
    entries.put(key, fresh);
    bytes += fresh.bytes();
    var oldest = entries.entrySet().iterator();
    while (bytes > highestBytes && oldest.hasNext()) {
      bytes -= oldest.next().getValue().bytes();
      oldest.remove();
    }
    return fresh;
  }

  private synchronized void remove(Key key, Entry entry) {
    if (entries.remove(key, entry)) {
      bytes -= entry.bytes();
    }
  }
}
