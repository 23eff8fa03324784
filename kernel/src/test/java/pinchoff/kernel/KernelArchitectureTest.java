package pinchoff.kernel;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.library.dependencies.SlicesRuleDefinition;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/**
 * The kernel's architecture as tests: package order, homes of libraries, what it sees of stdlib.
 */
class KernelArchitectureTest {

  /** Packages of the kernel, each with those that it may use. */
  private static final Map<String, Set<String>> USES =
      new TreeMap<>(
          Map.ofEntries(
              Map.entry("limits", Set.of()),
              Map.entry("json", Set.of("limits")),
              Map.entry("wire", Set.of("limits", "json")),
              Map.entry("protocol", Set.of("limits", "json", "wire")),
              Map.entry("eval", Set.of("limits")),
              Map.entry("session", Set.of("limits", "json", "wire", "protocol", "eval")),
              Map.entry(
                  "transport", Set.of("limits", "json", "wire", "protocol", "eval", "session")),
              Map.entry("client", Set.of("limits", "json", "wire", "protocol")),
              Map.entry("notebook", Set.of("limits", "json")),
              Map.entry("run", Set.of("limits", "json", "wire", "protocol", "client", "notebook")),
              Map.entry(
                  "review",
                  Set.of("limits", "json", "wire", "protocol", "client", "notebook", "run")),
              Map.entry("report", Set.of("limits", "json", "notebook")),
              Map.entry(
                  "cli",
                  Set.of(
                      "limits",
                      "json",
                      "wire",
                      "protocol",
                      "eval",
                      "session",
                      "transport",
                      "client",
                      "notebook",
                      "run",
                      "review",
                      "report"))));

  /** Third-party library to the packages that may use it: one home, or two ends of one wire. */
  private static final Map<String, List<String>> HOMES =
      new TreeMap<>(
          Map.of(
              "jdk.jshell..", List.of("eval"),
              "org.objectweb.asm..", List.of("eval"),
              "org.zeromq..", List.of("transport", "client"),
              "tools.jackson..", List.of("json"),
              "picocli..", List.of("cli")));

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("pinchoff");

  private static boolean inKernel(JavaClass type) {
    return type.getPackageName().startsWith("pinchoff.kernel");
  }

  private static String layerOf(JavaClass type) {
    String[] parts = type.getPackageName().split("\\.");
    return parts.length > 2 ? parts[2] : "";
  }

  @Test
  void enoughClassesAreRead() {
    long kernel = CLASSES.stream().filter(KernelArchitectureTest::inKernel).count();
    long library = CLASSES.size() - kernel;
    assertTrue(
        kernel > 5 && library > 5, () -> kernel + " kernel, " + library + " library classes");
  }

  @Test
  void packagesUseOnlyWhatTheyMay() {
    List<String> faults = new ArrayList<>();
    for (JavaClass type : CLASSES) {
      if (!inKernel(type)) {
        continue;
      }
      String own = layerOf(type);
      Set<String> allowed = USES.get(own);
      if (allowed == null) {
        faults.add(type.getName() + " is in a package that the table does not list");
        continue;
      }
      for (var dependency : type.getDirectDependenciesFromSelf()) {
        JavaClass target = dependency.getTargetClass();
        if (inKernel(target)
            && !layerOf(target).equals(own)
            && !allowed.contains(layerOf(target))) {
          faults.add(dependency.getDescription());
        }
      }
    }
    assertTrue(faults.isEmpty(), () -> String.join("\n", new TreeSet<>(faults)));
  }

  @Test
  void theKernelSeesOnlyTheDisplayContractOfTheLibrary() {
    List<String> faults = new ArrayList<>();
    for (JavaClass type : CLASSES) {
      for (var dependency : type.getDirectDependenciesFromSelf()) {
        JavaClass target = dependency.getTargetClass();
        String name = target.getPackageName();
        if (!name.startsWith("pinchoff") || inKernel(type) == inKernel(target)) {
          continue;
        }
        if (!inKernel(type) || !name.equals("pinchoff.display")) {
          faults.add(dependency.getDescription());
        }
      }
    }
    assertTrue(faults.isEmpty(), () -> String.join("\n", faults));
  }

  @Test
  void packagesHaveNoCycles() {
    SlicesRuleDefinition.slices()
        .matching("pinchoff.kernel.(**)")
        .should()
        .beFreeOfCycles()
        .check(CLASSES);
  }

  @Test
  void eachLibraryHasItsHome() {
    HOMES.forEach(
        (library, homes) ->
            noClasses()
                .that()
                .resideInAPackage("pinchoff.kernel..")
                .and()
                .resideOutsideOfPackages(
                    homes.stream().map(h -> "pinchoff.kernel." + h + "..").toArray(String[]::new))
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(library)
                .check(CLASSES));
  }

  @Test
  void onlyTheCommandLineEndsTheProcess() {
    noClasses()
        .that()
        .resideOutsideOfPackages("pinchoff.kernel.cli..")
        .should()
        .callMethod(System.class, "exit", int.class)
        .check(CLASSES);
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
