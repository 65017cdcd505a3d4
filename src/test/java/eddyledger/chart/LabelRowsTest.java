package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** Labels that would stand on each other move apart, and no further. */
class LabelRowsTest {
  @Test
  void labelsWithRoomStayWhereTheyAre() {
    double[] wanted = {10.0, 30.0, 50.0};
    assertThat(LabelRows.apart(wanted, 15.0, 0.0, 100.0)).containsExactly(10.0, 30.0, 50.0);
  }

  @Test
  void labelsMoveDownFromEachOtherAndUpFromTheBottom() {
    assertThat(LabelRows.apart(new double[] {10.0, 12.0}, 15.0, 0.0, 100.0))
        .containsExactly(10.0, 25.0);
    assertThat(LabelRows.apart(new double[] {95.0, 99.0}, 15.0, 0.0, 100.0))
        .containsExactly(85.0, 100.0);
    assertThat(LabelRows.apart(new double[] {-5.0}, 15.0, 0.0, 100.0)).containsExactly(0.0);
    assertThat(LabelRows.apart(new double[0], 15.0, 0.0, 100.0)).isEmpty();
  }

  @Test
  void asManyAsThereIsRoomForKeepTheirDistanceInside() {
    long seed = 20260315L;
    Random random = new Random(seed);
    for (int run = 0; run < 200; run++) {
      int count = 1 + random.nextInt(LabelRows.room(14.0, 5.0, 180.0));
      double[] wanted = random.doubles(count, 0.0, 200.0).sorted().toArray();
      double[] places = LabelRows.apart(wanted, 14.0, 5.0, 180.0);
      for (int i = 0; i < count; i++) {
        assertThat(places[i]).as("seed %d, run %d", seed, run).isBetween(5.0 - 1e-9, 180.0);
        if (i > 0) {
          assertThat(places[i] - places[i - 1]).as("run %d", run).isGreaterThan(14.0 - 1e-9);
        }
      }
    }
  }

  @Test
  void roomIsCounted() {
    assertThat(LabelRows.room(14.0, 0.0, 28.0)).isEqualTo(3);
    assertThat(LabelRows.room(14.0, 0.0, 27.9)).isEqualTo(2);
    assertThat(LabelRows.room(14.0, 10.0, 0.0)).isEqualTo(1);
  }
}
