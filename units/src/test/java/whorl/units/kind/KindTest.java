package whorl.units.kind;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class KindTest {

  @ParameterizedTest
  @CsvSource({
    "moment of inertia, rotational_inertia",
    "rotational inertia, rotational_inertia",
    "rotational_inertia, rotational_inertia",
    "Torque, torque",
    "bending moment, torque",
    "displacement per revolution, displacement_per_angle",
    "pressure, stress",
    "mass per length, mass_per_length",
    "' angular  velocity ', angular_velocity"
  })
  void kindIsFoundByTheWordsOfTheTrade(String words, String name) {
    assertEquals(Optional.of(Kind.named(name)), Kind.find(words));
  }

  @ParameterizedTest
  @ValueSource(strings = {"time per radian", "velocity squared", "", "torqe"})
  void internalAndUnknownKindsAreNotFound(String words) {
    assertTrue(Kind.find(words).isEmpty());
  }

  @Test
  void noTwoShownKindsShareTheirWords() {
    var words = new HashSet<String>();
    for (Kind kind : Kind.all()) {
      assertTrue(kind.isInternal() || words.add(kind.words()), kind.words());
    }
  }

  @Test
  void specialCaseHasTheDimensionOfItsParent() {
    for (Kind kind : Kind.all()) {
      kind.parent().ifPresent(parent -> assertEquals(parent.dimension(), kind.dimension()));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "torque, a torque",
    "energy, an energy",
    "angular_velocity, an angular velocity",
    "rotational_inertia, a moment of inertia",
    "unbalance, an unbalance"
  })
  void wordsTakeTheirArticle(String name, String words) {
    assertEquals(words, Kind.named(name).withArticle());
  }

  @Test
  void radiusGoesWithLengthButNotWithLead() {
    Kind radius = Kind.named("radius");
    assertTrue(radius.goesWith(Kind.named("length")));
    assertTrue(Kind.named("length").goesWith(radius));
    assertFalse(radius.goesWith(Kind.named("lead")));
  }

  @Test
  void unknownNameIsRefusedByName() {
    var thrown = assertThrows(IllegalArgumentException.class, () -> Kind.named("torqe"));
    assertEquals("no kind of quantity is named \"torqe\"", thrown.getMessage());
  }
}
