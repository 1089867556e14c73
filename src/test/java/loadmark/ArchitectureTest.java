package loadmark;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static java.util.Map.entry;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/** Holds the packages to the one way that data goes. */
class ArchitectureTest {
  private static final String ANTLR = "org.antlr..";
  private static final String COMMONS_MATH = "org.apache.commons.math3..";
  private static final String EJML = "org.ejml..";
  private static final String JACKSON = "com.fasterxml.jackson..";
  private static final String JGRAPHT = "org.jgrapht..";
  private static final String PICOCLI = "picocli..";

  /** What each package may use, beside itself and the JDK. */
  private static final Map<String, List<String>> MAY_USE =
      Map.ofEntries(
          entry("quantity", List.of()),
          entry("diagnostic", List.of()),
          entry("touchstone", List.of("diagnostic", "quantity")),
          entry("syntax", List.of("diagnostic", ANTLR)),
          entry("network", List.of("quantity")),
          entry("binding", List.of("diagnostic", "quantity", "syntax", "network", JGRAPHT)),
          entry("equation", List.of("network", "quantity")),
          entry("solve", List.of("equation", EJML)),
          entry("response", List.of("network", "equation", "solve", EJML, COMMONS_MATH)),
          entry("judge", List.of("network", "response", COMMONS_MATH)),
          entry("allowance", List.of("network", "response", "judge", COMMONS_MATH)),
          entry(
              "study",
              List.of(
                  "quantity",
                  "diagnostic",
                  "syntax",
                  "network",
                  "binding",
                  "equation",
                  "solve",
                  "response",
                  "judge",
                  "allowance")),
          entry(
              "report",
              List.of(
                  "diagnostic",
                  "study",
                  "allowance",
                  "judge",
                  "response",
                  "network",
                  "quantity",
                  "touchstone",
                  COMMONS_MATH,
                  JACKSON)),
          entry("cli", List.of("study", "report", "diagnostic", PICOCLI)));

  @TestFactory
  Stream<DynamicTest> everyPackageUsesOnlyWhatTheMapAllows() {
    JavaClasses all =
        new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("loadmark");
    return MAY_USE.entrySet().stream()
        .sorted(Map.Entry.comparingByKey())
        .map(e -> DynamicTest.dynamicTest(e.getKey(), () -> check(all, e.getKey(), e.getValue())));
  }

  private static void check(JavaClasses all, String name, List<String> allowed) {
    String[] packages =
        Stream.concat(
                Stream.of("java..", "org.jspecify..", inHouse(name)),
                allowed.stream().map(a -> a.endsWith("..") ? a : inHouse(a)))
            .toArray(String[]::new);
    classes()
        .that(resideInAnyPackage(inHouse(name)))
        .should()
        .onlyDependOnClassesThat(resideInAnyPackage(packages))
        .allowEmptyShould(true)
        .check(all);
  }

  private static String inHouse(String name) {
    return "loadmark." + name + "..";
  }
}
