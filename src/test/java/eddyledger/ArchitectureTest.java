package eddyledger;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * The architecture, kept by machine: a package imports only from those above it in {@link #LAYERS}
 * and from the libraries of its own row. DEVELOPERS.md says why.
 */
class ArchitectureTest {
  private static final String COMMONS_MATH = "org.apache.commons.math3..";
  private static final String JACKSON = "com.fasterxml.jackson..";
  private static final String PICOCLI = "picocli..";
  private static final String ACCESSIBILITY = "javax.accessibility..";

  /** One row of the table: a package below the base package, and its outside libraries. */
  private record Layer(String name, String... libraries) {}

  /** Top to bottom; each may use itself and whatever stands above it. */
  private static final List<Layer> LAYERS =
      List.of(
          new Layer("quantity"),
          new Layer("model"),
          new Layer("check"),
          new Layer("physics"),
          new Layer("physics.flow", COMMONS_MATH),
          new Layer("physics.wallpressure", COMMONS_MATH),
          new Layer("physics.vibration", COMMONS_MATH),
          new Layer("physics.path", COMMONS_MATH),
          new Layer("physics.cabin", COMMONS_MATH),
          new Layer("ledger"),
          new Layer("allot"),
          new Layer("lighten"),
          new Layer("spread", COMMONS_MATH),
          new Layer("bridge"),
          new Layer("file", JACKSON),
          new Layer(
              "workbook",
              "org.apache.poi..",
              "org.openxmlformats..",
              "org.apache.xmlbeans..",
              "org.apache.commons.compress.."),
          new Layer("chart", "org.jfree..", "java.awt..", "javax.swing..", ACCESSIBILITY),
          new Layer("app"),
          new Layer("command", PICOCLI),
          new Layer("present"),
          new Layer(
              "window",
              "javax.swing..",
              "java.awt..",
              "java.beans..",
              ACCESSIBILITY,
              "com.formdev..",
              "net.miginfocom.."));

  private static final JavaClasses MAIN =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("eddyledger");

  @TestFactory
  Stream<DynamicTest> aPackageImportsOnlyFromThoseAboveIt() {
    return LAYERS.stream()
        .map(layer -> DynamicTest.dynamicTest(layer.name(), () -> checkLayer(layer)));
  }

  private static void checkLayer(Layer layer) {
    List<String> allowed = new ArrayList<>(List.of("java.lang..", "java.util..", "java.math.."));
    allowed.addAll(List.of("java.time..", "java.text..", "java.io..", "java.nio.."));
    allowed.addAll(Arrays.asList(layer.libraries()));
    for (Layer above : LAYERS) {
      if (!mayNotSee(layer.name(), above.name())) {
        allowed.add(exactly(above.name()));
      }
      if (above.equals(layer)) {
        break;
      }
    }
    classes()
        .that()
        .resideInAPackage(exactly(layer.name()))
        .should()
        .onlyDependOnClassesThat(resideInAnyPackage(allowed.toArray(String[]::new)))
        .allowEmptyShould(true)
        .check(MAIN);
  }

  /** The rules that the order of the table does not say. */
  private static boolean mayNotSee(String lower, String upper) {
    boolean physicsSeesModel =
        lower.startsWith("physics") && List.of("model", "check").contains(upper);
    boolean showsComputes =
        List.of("workbook", "chart", "window", "command", "present").contains(lower)
            && upper.startsWith("physics");
    return physicsSeesModel || showsComputes;
  }

  private static String exactly(String name) {
    return "eddyledger." + name;
  }

  @Test
  void everyPackageStandsInTheTable() {
    List<String> known = LAYERS.stream().map(layer -> exactly(layer.name())).toList();
    assertThat(MAIN.stream().map(type -> type.getPackageName()).distinct())
        .allMatch(name -> name.equals("eddyledger") || known.contains(name));
  }

  @Test
  void swingAndAwtOnlyInWindowAndChart() {
    noClasses()
        .that()
        .resideOutsideOfPackages("eddyledger.window..", "eddyledger.chart..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("javax.swing..", "java.awt..")
        .check(MAIN);
  }

  @Test
  void computationKnowsNoFiles() {
    noClasses()
        .that()
        .resideInAnyPackage(
            "eddyledger.quantity..",
            "eddyledger.model..",
            "eddyledger.check..",
            "eddyledger.physics..",
            "eddyledger.ledger..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("java.io..", "java.nio..")
        .check(MAIN);
  }

  @Test
  void onlyTheEntryStandsInTheBasePackage() {
    assertThat(MAIN.stream().filter(type -> type.getPackageName().equals("eddyledger")))
        .allMatch(type -> type.getSimpleName().equals("Eddyledger"));
  }

  @Test
  void noMutableStaticState() {
    fields().that().areStatic().should().haveModifier(JavaModifier.FINAL).check(MAIN);
  }

  @Test
  void noMainFileOver250Lines() throws IOException {
    try (Stream<Path> files = Files.walk(Path.of("src", "main", "java"))) {
      List<String> tooLong = new ArrayList<>();
      for (Path file : files.filter(path -> path.toString().endsWith(".java")).toList()) {
        long lines = Files.readAllLines(file).size();
        if (lines > 250) {
          tooLong.add(file + ": " + lines);
        }
      }
      assertThat(tooLong).isEmpty();
    }
  }
}
