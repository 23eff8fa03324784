package pinchoff;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.library.dependencies.SlicesRuleDefinition;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** The architecture as tests: package order, homes of libraries, nothing printed, no nulls. */
class ArchitectureTest {

  /** Packages in dependency order: each may use those before it, and no other. */
  private static final List<String> ORDER =
      List.of(
          "display",
          "source",
          "numeric",
          "quantity",
          "page",
          "drawing",
          "chart",
          "formula",
          "device",
          "technology",
          "circuit",
          "derive",
          "claims",
          "spread",
          "extract",
          "cells");

  /** Third-party library to the one package that may use it. */
  private static final Map<String, String> HOMES =
      new TreeMap<>(
          Map.of(
              "org.hipparchus..", "numeric",
              "tools.jackson..", "technology",
              "java.awt..", "drawing"));

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("pinchoff");

  private static String layerOf(JavaClass type) {
    String[] parts = type.getPackageName().split("\\.");
    return parts.length > 1 ? parts[1] : "";
  }

  @Test
  void enoughClassesAreRead() {
    assertTrue(CLASSES.size() > 5, () -> "only " + CLASSES.size() + " classes were read");
  }

  @Test
  void packagesUseOnlyThoseBeforeThem() {
    List<String> faults = new ArrayList<>();
    for (JavaClass type : CLASSES) {
      int own = ORDER.indexOf(layerOf(type));
      if (own < 0) {
        faults.add(type.getName() + " is in a package that the order does not list");
        continue;
      }
      for (var dependency : type.getDirectDependenciesFromSelf()) {
        JavaClass target = dependency.getTargetClass();
        if (target.getPackageName().startsWith("pinchoff")
            && ORDER.indexOf(layerOf(target)) > own) {
          faults.add(dependency.getDescription());
        }
      }
    }
    assertTrue(faults.isEmpty(), () -> String.join("\n", new TreeSet<>(faults)));
  }

  @Test
  void packagesHaveNoCycles() {
    SlicesRuleDefinition.slices()
        .matching("pinchoff.(**)")
        .should()
        .beFreeOfCycles()
        .check(CLASSES);
  }

  @Test
  void eachLibraryHasOneHome() {
    HOMES.forEach(
        (library, home) ->
            noClasses()
                .that()
                .resideOutsideOfPackage("pinchoff." + home + "..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(library)
                .check(CLASSES));
  }

  @Test
  void publicSignaturesShowNoLibraryTypes() {
    List<String> faults = new ArrayList<>();
    for (JavaClass type : CLASSES) {
      if (!type.getModifiers().contains(JavaModifier.PUBLIC)) {
        continue;
      }
      type.getMethods().stream()
          .filter(m -> m.getModifiers().contains(JavaModifier.PUBLIC))
          .forEach(
              m -> {
                List<JavaClass> seen = new ArrayList<>(m.getRawParameterTypes());
                seen.add(m.getRawReturnType());
                seen.stream()
                    .map(JavaClass::getBaseComponentType)
                    .map(JavaClass::getPackageName)
                    .filter(
                        p -> !p.isEmpty() && !p.startsWith("java.") && !p.startsWith("pinchoff"))
                    .forEach(p -> faults.add(m.getFullName() + " shows a type of " + p));
              });
    }
    assertTrue(faults.isEmpty(), () -> String.join("\n", faults));
  }

  @Test
  void nothingPrintsOrExits() {
    noClasses()
        .should()
        .accessField(System.class, "out")
        .orShould()
        .accessField(System.class, "err")
        .orShould()
        .callMethod(System.class, "exit", int.class)
        .check(CLASSES);
  }

  @Test
  void transcendentalFunctionsAreTheReproducibleOnes() {
    List<String> platformDependent =
        List.of(
            "sin", "cos", "tan", "asin", "acos", "atan", "atan2", "exp", "log", "log10", "log1p",
            "expm1", "pow", "cbrt", "sinh", "cosh", "tanh", "hypot");
    List<String> faults = new ArrayList<>();
    for (JavaClass type : CLASSES) {
      type.getMethodCallsFromSelf().stream()
          .filter(c -> c.getTargetOwner().isEquivalentTo(Math.class))
          .filter(c -> platformDependent.contains(c.getName()))
          .forEach(c -> faults.add(c.getDescription()));
    }
    assertTrue(faults.isEmpty(), () -> String.join("\n", faults));
  }

  @Test
  void everyPackageIsNullMarked() throws ClassNotFoundException {
    List<String> faults = new ArrayList<>();
    for (String name : new TreeSet<>(CLASSES.stream().map(JavaClass::getPackageName).toList())) {
      if (!Class.forName(name + ".package-info").isAnnotationPresent(NullMarked.class)) {
        faults.add(name);
      }
    }
    assertTrue(faults.isEmpty(), () -> "not null-marked: " + faults);
  }
}
