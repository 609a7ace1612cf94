package whorl.report;

import static whorl.report.Trees.NOWHERE;
import static whorl.report.Trees.call;
import static whorl.report.Trees.compare;
import static whorl.report.Trees.magnitude;
import static whorl.report.Trees.name;
import static whorl.report.Trees.num;
import static whorl.report.Trees.product;
import static whorl.report.Trees.squared;
import static whorl.report.Trees.sum;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.eval.Value;
import whorl.sheet.CellId;
import whorl.sheet.Comparison;
import whorl.sheet.Given;
import whorl.sheet.Place;
import whorl.sheet.Quantity;
import whorl.sheet.Standing;
import whorl.sheet.Step;
import whorl.sheet.Verdict;
import whorl.syntax.Expr;
import whorl.syntax.Statement;
import whorl.units.Unit;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;
import whorl.units.UnitText;

/** The steps of an invented flywheel note with every form of step in it. */
final class SampleNote {
  private static final Place HERE = new Place(new CellId("a"), 0, 1);

  final List<Step> steps = new ArrayList<>();
  final Source source = new Source("L [kN·m·s] = I * n\nt_stop [s] = I * n\n");

  static Unit unit(String text) {
    return UnitCatalogue.standard().resolve(UnitReader.read(text));
  }

  static Quantity written(String digits, String unit, String kind) {
    Unit resolved = unit(unit);
    double si = resolved.toSi(Double.parseDouble(digits));
    return new Quantity(new Value.Real(si), resolved, true, kind, digits);
  }

  static Quantity real(double si, String unit, String kind) {
    return new Quantity(new Value.Real(si), unit(unit), true, kind, null);
  }

  static Quantity free(double si, String unit, String kind) {
    return new Quantity(new Value.Real(si), unit(unit), false, kind, null);
  }

  static Quantity arrow(double x, double y, double z, String unit, String kind) {
    return new Quantity(new Value.Vector(x, y, z), unit(unit), false, kind, null);
  }

  static Step.Defined input(String name, Quantity quantity, String remark) {
    Expr value = num(quantity.written() == null ? "0" : quantity.written());
    return new Step.Defined(
        HERE, definition(name, value, remark), true, List.of(), quantity, Standing.FIRM);
  }

  static Step.Defined derived(
      String name, Expr value, Quantity gives, String remark, List<String> doubts, Given... with) {
    return new Step.Defined(
        HERE,
        definition(name, value, remark),
        false,
        List.of(with),
        gives,
        new Standing(doubts, List.of()));
  }

  static Statement.Definition definition(String name, Expr value, String remark) {
    return new Statement.Definition(NOWHERE, name(name), null, value, List.of(), remark);
  }

  static Step.Checked check(
      Expr.Comparison text,
      Quantity left,
      Quantity right,
      Quantity margin,
      double share,
      boolean holds,
      String remark,
      Given... with) {
    var comparison = new Comparison(text, left, right, OptionalDouble.of(share), margin, holds);
    return new Step.Checked(
        HERE,
        new Statement.Check(NOWHERE, false, text, remark),
        List.of(with),
        new Verdict(holds, List.of(comparison)),
        Standing.FIRM);
  }

  static SampleNote flywheel() {
    var note = new SampleNote();
    Quantity m = written("412", "kg", "mass");
    Quantity d = written("900", "mm", "length");
    Quantity n = written("6000", "rpm", "angular velocity");
    Quantity t = written("350", "N·m", "torque");
    double inertia = 0.5 * 412 * 0.45 * 0.45;
    double speed = 6000 * Math.PI / 30;
    Quantity i = real(inertia, "kg·m²", "moment of inertia");
    Quantity l = real(inertia * speed, "kN·m·s", "angular momentum");
    Quantity e = real(0.5 * inertia * speed * speed, "MJ", "energy");
    Given gm = new Given("m", m);
    Given gd = new Given("D", d);
    Given gn = new Given("n", n);
    Given gi = new Given("I", i);
    note.add(input("m", m, "weighed on the shop scale"));
    note.add(input("D", d, "drawing 7-031"));
    note.add(input("n", n, "rated speed"));
    note.add(input("T_brake", t, "brake sheet"));
    note.add(
        derived(
            "I",
            product(
                num("1"),
                "/",
                num("2"),
                "*",
                name("m"),
                "*",
                squared(product(name("D"), "/", num("2")))),
            i,
            "",
            List.of(),
            gm,
            gd));
    note.add(
        derived(
            "L",
            product(name("I"), "*", name("n")),
            l,
            "n is in rpm: the sheet converts",
            List.of(),
            gi,
            gn));
    note.add(
        derived(
            "E",
            product(num("1"), "/", num("2"), "*", name("I"), "*", squared(name("n"))),
            e,
            "",
            List.of(),
            gi,
            gn));
    note.add(
        derived(
            "E_h",
            product(num("1"), "/", num("2"), "*", name("I"), "*", squared(name("n"))),
            real(0.5 * inertia * speed * speed, "kWh", "energy"),
            "the same in the unit of the bill",
            List.of(),
            gi,
            gn));
    note.add(
        derived(
            "t_stop",
            product(name("L"), "/", name("T_brake")),
            real(inertia * speed / 350, "s", "time"),
            "constant braking torque",
            List.of("T_brake ≥ 400 N·m"),
            new Given("L", l),
            new Given("T_brake", t)));
    note.add(
        derived(
            "σ_t",
            product(
                sum(num("3"), "+", name("ν_s")),
                "/",
                num("8"),
                "*",
                name("ρ_s"),
                "*",
                squared(product(name("D_r"), "/", num("2"))),
                "*",
                squared(name("n"))),
            real(187.0321e6, "MPa", "stress"),
            "solid disc, plane stress, at the centre",
            List.of(),
            new Given("ν_s", written("0.30", "1", "number")),
            new Given("ρ_s", written("7850", "kg/m³", "density")),
            new Given("D_r", written("850", "mm", "length")),
            new Given("n", written("5400", "rpm", "angular velocity"))));
    note.add(
        derived(
            "a_c",
            product(name("pi"), "/", num("4"), "*", squared(name("d_c")), "/", name("k_f")),
            real(5.385587e-4, "mm^2", "area"),
            "",
            List.of(),
            new Given("d_c", written("24", "mm", "length")),
            new Given("k_f", written("0.84", "1", "number"))));
    note.add(
        derived(
            "ω_nu",
            call(
                "sqrt",
                sum(
                    product(name("q_d"), "/", squared(name("I_t"))),
                    "+",
                    squared(product(name("Ω_1"), "*", call("sin", name("θ_0")))))),
            real(22.84914, "rad/s", "angular velocity"),
            "small nutation about steady precession",
            List.of(),
            new Given("q_d", real(281.2613, "N^2·m^2·s^2", "")),
            new Given("I_t", real(0.7362938, "kg·m²", "moment of inertia")),
            new Given("Ω_1", real(2.089339, "rad/s", "angular velocity")),
            new Given("θ_0", written("120", "deg", "angle"))));
    note.add(
        derived(
            "P",
            sum(
                product(name("T_1"), "*", name("ω_1")),
                "+",
                product(name("F_2"), "*", name("v_2")),
                "-",
                product(name("c_d"), "*", squared(name("ω_1"))),
                "-",
                product(
                    name("m_r"),
                    "*",
                    name("g_n"),
                    "*",
                    name("v_2"),
                    "*",
                    call("sin", name("θ_q")))),
            free(48211.7, "W", "power"),
            "",
            List.of()));
    note.add(
        derived(
            "M_v",
            product(name("Ω_v"), "×", name("L_v")),
            arrow(1931.41, 0, 0, "N·m", "moment of force"),
            "what the bearings must give the rotor",
            List.of(),
            new Given("Ω_v", arrow(0, 0.0530624, 0, "rad/s", "angular velocity")),
            new Given("L_v", arrow(0, 0, 36398.85, "kg·m^2/s", "angular momentum"))));
    note.add(
        new Step.Shown(
            HERE,
            new Statement.Show(NOWHERE, magnitude(name("M_v")), null, ""),
            List.of(new Given("M_v", arrow(1931.41, 0, 0, "N·m", "moment of force"))),
            free(1931.41, "N·m", "moment of force"),
            Standing.FIRM));
    note.add(
        derived(
            "F_m",
            new Expr.Choice(
                NOWHERE,
                compare(name("n"), Expr.Relation.AT_MOST, name("n_1")),
                product(name("M_p"), "/", name("b")),
                product(num("2"), "*", name("M_p"), "/", name("b"))),
            real(3115.2, "kN", "force"),
            "above n_1 both bearings may share unevenly",
            List.of(),
            gn,
            new Given("n_1", written("5000", "rpm", "angular velocity")),
            new Given("M_p", real(1931.4, "kN·m", "torque")),
            new Given("b", written("620", "mm", "length"))));
    var area = new UnitText(List.of(new UnitText.Power("mm", 1)), List.of());
    var metre = new UnitText(List.of(new UnitText.Power("m", 1)), List.of());
    note.add(
        new Step.Function(
            HERE,
            new Statement.Function(
                NOWHERE,
                name("R"),
                List.of(
                    new Statement.Parameter(
                        NOWHERE, name("x"), new Statement.Bracket(NOWHERE, metre, null, null))),
                new Statement.Bracket(NOWHERE, area, null, null),
                call(
                    "sqrt",
                    sum(
                        squared(name("r_c")),
                        "+",
                        product(
                            sum(name("l_0"), "-", name("x")),
                            "*",
                            name("a_c"),
                            "/",
                            product(name("pi"), "*", name("b_s"))))),
                "wound radius"),
            List.of(
                new Given("r_c", written("300", "mm", "radius")),
                new Given("l_0", written("600", "m", "length"))),
            "radius",
            Standing.FIRM));
    note.add(
        check(
            compare(name("E"), Expr.Relation.AT_MOST, num("10", "MJ")),
            e,
            written("10", "MJ", "energy"),
            real(10e6 - 8.234e6, "MJ", "energy"),
            0.8234,
            true,
            "containment rating",
            new Given("E", e)));
    note.add(
        check(
            compare(name("σ_t"), Expr.Relation.AT_MOST, product(name("R_p"), "/", num("3"))),
            real(230.9039e6, "MPa", "stress"),
            real(230e6, "MPa", "stress"),
            real(-0.9039e6, "MPa", "stress"),
            230.9039 / 230,
            false,
            "containment rating",
            new Given("σ_t", real(230.9039e6, "MPa", "stress")),
            new Given("R_p", written("690", "MPa", "stress"))));
    note.add(
        new Step.Reproduced(
            HERE,
            new Statement.Reproduction(
                NOWHERE,
                false,
                name("L"),
                num("26.2", "kN·m·s"),
                num("1", "%"),
                "pocket calculator, 14 March"),
            List.of(new Given("L", l)),
            l,
            written("26.2", "kN·m·s", "angular momentum"),
            (inertia * speed - 26200) / 26200,
            0.01,
            true,
            Standing.FIRM));
    note.add(
        new Step.Reproduced(
            HERE,
            new Statement.Reproduction(
                NOWHERE,
                false,
                name("M_p"),
                num("1.70", "kN·m"),
                num("3", "%"),
                "meeting of 2 April"),
            List.of(),
            real(1931.41, "kN·m", "torque"),
            written("1.70", "kN·m", "torque"),
            (1931.41 - 1700) / 1700,
            0.03,
            false,
            Standing.FIRM));
    Expr.Comparison assumption =
        compare(
            squared(name("L_s")),
            Expr.Relation.AT_LEAST,
            product(num("10"), "*", name("I_t"), "*", name("T_90")));
    note.add(
        new Step.Assumed(
            HERE,
            new Statement.Assumption(
                NOWHERE, assumption, "gyroscopic enough for the two formulas to be near"),
            List.of(
                new Given("L_s", real(15.23248, "N·m·s", "angular momentum")),
                new Given("I_t", real(0.7362938, "kg·m²", "moment of inertia")),
                new Given("T_90", real(33.43289, "N·m", "torque"))),
            new Verdict(
                false,
                List.of(
                    new Comparison(
                        assumption,
                        real(232.0284, "1", ""),
                        real(246.1643, "1", ""),
                        OptionalDouble.of(246.1643 / 232.0284),
                        real(-14.1359, "N^2·m^2·s^2", ""),
                        false))),
            Standing.FIRM));
    note.add(
        new Step.Waiting(
            HERE,
            definition("P_f", product(name("T_f"), "*", name("n_O")), ""),
            List.of("n_O"),
            List.of(List.of("n_0", "n_1"))));
    note.add(
        new Step.Broken(
            HERE,
            definition("t_stop", product(name("I"), "*", name("n")), ""),
            new Diagnostic(
                "kind",
                "t_stop is declared as a time, but its right side is an angular momentum.",
                new Span(32, 37),
                "kg·m²·rad/s",
                List.of(),
                "They differ by a torque.",
                "An angular momentum over a torque is a time: I * n / T"),
            free(74.9, "s", "time")));
    return note;
  }

  private void add(Step step) {
    steps.add(step);
  }

  /** Writes the sample as HTML and prints it as text. */
  public static void main(String[] arguments) throws java.io.IOException {
    SampleNote note = flywheel();
    CellReport report =
        CellReport.of(note.source, note.steps, List.of("I hides the law of that name"));
    java.nio.file.Files.writeString(java.nio.file.Path.of(arguments[0]), report.html());
    System.out.println(report.text());
  }
}
