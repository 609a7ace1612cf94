package whorl.laws;

import java.util.List;
import java.util.function.ToDoubleFunction;
import whorl.mechanics.gyro.ChangingInertia;

/** Inertia that changes with no moment from outside, where nothing leaves and where matter does. */
final class ChangingInertiaLaws {
  private static final String SAME_MATTER = "angular momentum of the same matter";

  private ChangingInertiaLaws() {}

  static List<Law> all() {
    return List.of(
        law(
            "same_matter_speed",
            "angular velocity after the inertia changed, with nothing leaving",
            "ω₂ = ω₁ I₁/I₂",
            "angular_velocity",
            "180 rpm",
            ChangingInertia::speedOfSameMatter),
        law(
            "same_matter_work",
            "work that changed the inertia, with nothing leaving",
            "W = L² (1/I₂ − 1/I₁)/2, L = I₁ ω₁; below zero where energy is given off",
            "energy",
            "189.49640450091567 J",
            ChangingInertia::workOnSameMatter),
        law(
            "leaving_momentum",
            "angular momentum that leaves with matter, whose speed does not change",
            "(I₁ − I₂) ω₁",
            "angular_momentum",
            "20.106192982974676 N·m·s",
            ChangingInertia::momentumTakenAlong),
        law(
            "leaving_energy",
            "kinetic energy that leaves with matter, whose speed does not change",
            "(I₁ − I₂) ω₁²/2",
            "energy",
            "63.165468166971885 J",
            ChangingInertia::energyTakenAlong));
  }

  private static Law law(
      String name,
      String title,
      String formula,
      String kind,
      String value,
      ToDoubleFunction<ChangingInertia> what) {
    var law = new LawBuilder(Room.MOMENTUM, name, title);
    String inertia = "rotational_inertia";
    var before = law.number("before", "I₁", inertia, "moment of inertia before");
    var after = law.number("after", "I₂", inertia, "moment of inertia after");
    var speed = law.number("speed", "ω₁", "angular_velocity", "angular velocity before");
    return law.formula(formula)
        .source(SAME_MATTER)
        .example(
            name + "(before = 4.8 kg·m², after = 1.6 kg·m², speed = 60 rpm)",
            value,
            "1e-9",
            "the formula, by hand")
        .gives(
            kind,
            g -> what.applyAsDouble(new ChangingInertia(before.in(g), after.in(g), speed.in(g))));
  }
}
