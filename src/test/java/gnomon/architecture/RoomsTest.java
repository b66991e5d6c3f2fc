package gnomon.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.methods;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/// The arrows between the rooms, and what each room may know of the libraries.
final class RoomsTest {
  private static final JavaClasses PROGRAM =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("gnomon");

  private static final List<String> ALGEBRA =
      List.of("algebra", "modular", "number", "polynomial", "form", "series");

  /// Every room, with the rooms it may import.
  private static final Map<String, Set<String>> ARROWS = arrows();

  private static Map<String, Set<String>> arrows() {
    Map<String, Set<String>> arrows = new TreeMap<>();
    Set<String> below = new TreeSet<>();
    for (String room : List.of("algebra", "modular", "number", "polynomial", "form")) {
      arrows.put(room, Set.copyOf(below));
      below.add(room);
    }
    arrows.put("decimal", Set.copyOf(below));
    for (String room : List.of("series", "operator", "basis", "recurrence", "summation")) {
      arrows.put(room, Set.copyOf(below));
      below.add(room);
    }
    below.add("decimal");
    Set<String> mathematics = Set.copyOf(below);
    arrows.put("diagnostic", Set.of());
    arrows.put("syntax", Set.of("diagnostic"));
    arrows.put("value", mathematics);
    arrows.put("evaluate", union(mathematics, "value", "syntax", "diagnostic"));
    arrows.put("render", union(mathematics, "value", "diagnostic"));
    arrows.put(
        "session", union(mathematics, "value", "syntax", "diagnostic", "evaluate", "render"));
    arrows.put("console", Set.of("session", "render", "syntax", "diagnostic"));
    arrows.put("launch", union(arrows.keySet()));
    return arrows;
  }

  private static Set<String> union(Set<String> rooms, String... more) {
    Set<String> all = new TreeSet<>(rooms);
    all.addAll(List.of(more));
    return all;
  }

  @Test
  void everyClassIsInARoomOfThePlan() {
    Set<String> unknown = new TreeSet<>();
    for (JavaClass type : PROGRAM) {
      if (!ARROWS.containsKey(room(type))) {
        unknown.add(type.getName());
      }
    }
    assertEquals(Set.of(), unknown);
  }

  @Test
  void importsFollowTheArrows() {
    List<String> against = new ArrayList<>();
    for (JavaClass type : PROGRAM) {
      for (Dependency dependency : type.getDirectDependenciesFromSelf()) {
        JavaClass target = dependency.getTargetClass().getBaseComponentType();
        if (target.getPackageName().startsWith("gnomon.")
            && !room(target).equals(room(type))
            && !ARROWS.getOrDefault(room(type), Set.of()).contains(room(target))) {
          against.add(room(type) + " -> " + room(target) + ": " + dependency.getDescription());
        }
      }
    }
    assertEquals(List.of(), against);
  }

  @Test
  void theArrowsHaveNoCycle() {
    for (String room : ARROWS.keySet()) {
      assertTrue(!reachable(room).contains(room), room + " reaches itself");
    }
  }

  private static Set<String> reachable(String from) {
    Set<String> seen = new TreeSet<>();
    List<String> open = new ArrayList<>(ARROWS.get(from));
    while (!open.isEmpty()) {
      String room = open.removeLast();
      if (seen.add(room)) {
        open.addAll(ARROWS.get(room));
      }
    }
    return seen;
  }

  @Test
  void onlySyntaxKnowsTheParserGenerator() {
    check(onlyIn("org.antlr..", "gnomon.syntax.."));
  }

  @Test
  void onlyConsoleAndLaunchKnowTheTerminal() {
    check(onlyIn("org.jline..", "gnomon.console..", "gnomon.launch.."));
  }

  @Test
  void onlyPolynomialKnowsTheFactoringLibrary() {
    check(onlyIn("cc.redberry..", "gnomon.polynomial.."));
  }

  @Test
  void onlyDecimalKnowsTheDigitLibrary() {
    check(onlyIn("org.apfloat..", "gnomon.decimal.."));
  }

  @Test
  void theMathematicsRoomsKnowNoTextOrLocale() {
    check(
        noClasses()
            .that()
            .resideInAnyPackage(mathematicsPackages())
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.text..", "java.awt..", "java.util.logging..")
            .orShould()
            .dependOnClassesThat()
            .haveFullyQualifiedName("java.util.Locale"));
  }

  @Test
  void onlyLaunchPrints() {
    check(
        noClasses()
            .that()
            .resideOutsideOfPackage("gnomon.launch..")
            .should()
            .accessField(System.class, "out")
            .orShould()
            .accessField(System.class, "err")
            .orShould()
            .callMethod(Throwable.class, "printStackTrace"));
  }

  @Test
  void onlyLaunchEndsTheProgram() {
    check(
        noClasses()
            .that()
            .resideOutsideOfPackage("gnomon.launch..")
            .should()
            .callMethod(System.class, "exit", int.class)
            .orShould()
            .callMethod(Runtime.class, "halt", int.class));
  }

  @Test
  void staticsAreFinal() {
    check(
        fields()
            .that()
            .areStatic()
            .and()
            .areDeclaredInClassesThat()
            .resideOutsideOfPackage("gnomon.syntax.grammar..")
            .should()
            .beFinal());
  }

  @Test
  void noFloatingTypesInFieldsOfTheExactRooms() {
    check(
        fields()
            .that()
            .areDeclaredInClassesThat()
            .resideOutsideOfPackages(FLOATING_ALLOWED)
            .should()
            .notHaveRawType(FLOATING));
  }

  @Test
  void noFloatingTypesInSignaturesOfTheExactRooms() {
    check(
        methods()
            .that()
            .areDeclaredInClassesThat()
            .resideOutsideOfPackages(FLOATING_ALLOWED)
            .should()
            .notHaveRawReturnType(FLOATING));
  }

  private static final String[] FLOATING_ALLOWED = {
    "gnomon.render..", "gnomon.decimal..", "gnomon.console..", "gnomon.launch.."
  };

  private static final DescribedPredicate<JavaClass> FLOATING =
      DescribedPredicate.describe(
          "float or double",
          type -> {
            JavaClass base = type.getBaseComponentType();
            return base.isEquivalentTo(float.class)
                || base.isEquivalentTo(double.class)
                || base.isEquivalentTo(Float.class)
                || base.isEquivalentTo(Double.class);
          });

  private static ArchRule onlyIn(String library, String... rooms) {
    return noClasses()
        .that()
        .resideOutsideOfPackages(rooms)
        .should()
        .dependOnClassesThat()
        .resideInAPackage(library);
  }

  private static void check(ArchRule rule) {
    rule.allowEmptyShould(true).check(PROGRAM);
  }

  private static String[] mathematicsPackages() {
    List<String> rooms = new ArrayList<>(ALGEBRA);
    rooms.addAll(List.of("operator", "basis", "summation", "decimal"));
    return rooms.stream().map(room -> "gnomon." + room + "..").toArray(String[]::new);
  }

  private static String room(JavaClass type) {
    String[] parts = type.getPackageName().split("\\.");
    return parts.length > 1 ? parts[1] : "";
  }
}
