package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import java.io.IOException;
import org.junit.jupiter.api.Test;

/** What stands over the pictures and what is said of them. */
class PictureTest {
  @Test
  void headingsSayWhatIsShown() throws IOException {
    ReceiverSheet sheet = ExampleLedger.ledger().sheet("hold", "row-2").orElseThrow();
    assertThat(Picture.STACK.heading()).isEqualTo("What makes each band");
    assertThat(Picture.STACK.word()).isEqualTo("Stack");
    assertThat(Picture.STACK.subHeading(sheet, "upper-side-left-a"))
        .isEqualTo("dB(A) per band, split by energy; outlined: Upper side left");
    assertThat(Picture.STACK.subHeading(sheet, "quillon-82"))
        .isEqualTo("dB(A) per band, split by energy");
    assertThat(Picture.SPECTRUM.heading()).isEqualTo("Level in each band");
    assertThat(Picture.SPECTRUM.subHeading(sheet, "crown-a"))
        .isEqualTo("dB(A) per band: Crown, Station A and the total");
    assertThat(Picture.SPECTRUM.subHeading(sheet, "quillon-82"))
        .isEqualTo("dB(A) per band: the total");
  }

  @Test
  void whatIsMissingIsSaid() throws IOException {
    ReceiverSheet sheet = ExampleLedger.without("crown-e").sheet("hold", "row-2").orElseThrow();
    assertThat(Picture.STACK.subHeading(sheet, "crown-e"))
        .isEqualTo("dB(A) per band, split by energy; without the missing Crown of Station E");
  }

  @Test
  void theDescriptionTellsThePicture() {
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("roof", SmallSheet.TOTAL, 3.0)
            .other("tyres", 1.0)
            .sheet(Status.OK, 80.0, State.OVER);
    assertThat(Picture.STACK.description(sheet, "roof"))
        .isEqualTo(
            "What makes each band at Driver, Road. dB(A) per band, split by energy; outlined: Roof."
                + " Total 80.5 dB(A). Allowed 80.0 dB(A), 0.5 over. Top to bottom: Tyres 25 %,"
                + " Roof 75 %.");
    assertThat(Picture.SPECTRUM.description(sheet, "roof"))
        .isEqualTo(
            "Level in each band at Driver, Road. dB(A) per band: Roof and the total."
                + " Total 80.5 dB(A). Allowed 80.0 dB(A), 0.5 over. Roof: 79.2 dB(A).");
  }

  @Test
  void ofAPartialTotalTheDescriptionSaysAtLeast() {
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("roof", SmallSheet.TOTAL, 3.0)
            .missing("door", SmallSheet.TOTAL, "no construction")
            .sheet(Status.PARTIAL);
    assertThat(Picture.SPECTRUM.description(sheet, "door"))
        .isEqualTo(
            "Level in each band at Driver, Road. dB(A) per band: Door and the total; without the"
                + " missing Door. Total at least 79.2 dB(A). Door: not known.");
  }
}
