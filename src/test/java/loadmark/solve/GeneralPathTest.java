package loadmark.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loadmark.equation.Branch;
import loadmark.equation.ChangedPlace;
import loadmark.equation.ComparedNetwork;
import loadmark.equation.ComparedNetwork.Topology;
import loadmark.equation.Constraint;
import loadmark.equation.Constraint.Terminals;
import loadmark.equation.Law;
import loadmark.network.OnePort.ElementKind;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** Parts that no branch admittance describes, by hand-built equations. Node 1 is common. */
class GeneralPathTest {
  private static final Offset<Double> TIGHT = within(1e-14);
  private static final int COMMON = ComparedNetwork.MINUS;

  private final List<Branch> branches = new ArrayList<>();
  private final List<Constraint> constraints = new ArrayList<>();
  private double[] values = {};
  private List<ChangedPlace> loads = List.of();

  private Law law(ElementKind kind, double value) {
    values = Arrays.copyOf(values, values.length + 1);
    values[values.length - 1] = value;
    return Law.element(kind, values.length - 1);
  }

  private void branch(int a, int b, ElementKind kind, double value) {
    branches.add(new Branch(a, b, law(kind, value)));
  }

  private void load(int a, int b, ElementKind kind, double value) {
    loads = List.of(ChangedPlace.of(a, b, false, Law.Fixed.OPEN, law(kind, value)));
  }

  /** V₁ = n·V₂, n·I₁ + I₂ = 0. */
  private void transformer(int a, int b, int c, int d, double turns) {
    constraints.add(
        new Constraint(
            List.of(new Terminals(a, b), new Terminals(c, d)),
            (re, im, voltage, current) -> {
              voltage[0] = 1;
              voltage[2] = -turns;
              current[4] = turns;
              current[6] = 1;
            }));
  }

  /** I₁ = 0, I₂ = g·V₁. */
  private void transconductance(int a, int b, int c, int d, double siemens) {
    constraints.add(
        new Constraint(
            List.of(new Terminals(a, b), new Terminals(c, d)),
            (re, im, voltage, current) -> {
              current[0] = 1;
              voltage[4] = -siemens;
              current[6] = 1;
            }));
  }

  /** V₁ = s(L₁I₁ + M·I₂), V₂ = s(M·I₁ + L₂I₂). */
  private void coupled(int a, int b, int c, int d, double l1, double l2, double m) {
    constraints.add(
        new Constraint(
            List.of(new Terminals(a, b), new Terminals(c, d)),
            (re, im, voltage, current) -> {
              voltage[0] = 1;
              voltage[6] = 1;
              double[] inductances = {l1, m, m, l2};
              for (int i = 0; i < 4; i++) {
                current[2 * i] = -re * inductances[i];
                current[2 * i + 1] = -im * inductances[i];
              }
            }));
  }

  private Solutions solve(int nodes, double omega) {
    ComparedNetwork network =
        new ComparedNetwork(
            nodes, branches, loads, constraints, Topology.CONNECTED, Topology.CONNECTED);
    Frequencies s = Frequencies.ofS(new double[] {0}, new double[] {omega});
    return new CaseSolver(network).solve(values, s);
  }

  @Test
  void idealTransformerTransformsByTheSquareOfItsTurns() {
    transformer(0, COMMON, 2, 3, 10);
    branch(2, 3, ElementKind.RESISTANCE, 4);
    load(2, 3, ElementKind.RESISTANCE, 4e12);
    Solutions found = solve(4, 1);
    assertThat(found.without().re(0)).isCloseTo(400, within(400e-15));
    // R/(R + R_L) of the change, with the secondary floating.
    assertThat(found.change().re(0) * -(1 + 1e12)).isCloseTo(1, TIGHT);
  }

  @Test
  void openTransformerIsOpen() {
    transformer(0, COMMON, 2, COMMON, 10);
    load(2, COMMON, ElementKind.RESISTANCE, 5);
    Solutions found = solve(3, 1);
    assertThat(found.without().state(0)).isEqualTo(Solutions.State.INFINITE);
    assertThat(found.with().re(0)).isCloseTo(500, within(500e-15));
    assertThat(found.change().re(0)).isEqualTo(-1);
  }

  @Test
  void gyratorTurnsACapacitorIntoAnInductor() {
    transconductance(0, COMMON, COMMON, 2, 0.5);
    transconductance(2, COMMON, 0, COMMON, 0.5);
    branch(2, COMMON, ElementKind.CAPACITANCE, 3);
    Solutions found = solve(3, 2);
    // Z = sC/g²
    assertThat(found.without().re(0)).isZero();
    assertThat(found.without().im(0)).isCloseTo(24, within(24e-15));
  }

  @Test
  void coupledInductors() {
    coupled(0, COMMON, 2, COMMON, 2, 3, 1);
    branch(2, COMMON, ElementKind.RESISTANCE, 4);
    Solutions found = solve(3, 1);
    // Z = sL₁ − s²M²/(sL₂ + R) = 2j + 1/(4 + 3j)
    assertThat(found.without().re(0)).isCloseTo(4.0 / 25, TIGHT);
    assertThat(found.without().im(0)).isCloseTo(2 - 3.0 / 25, TIGHT);
  }

  @Test
  void changeOfANetworkThatIsNotReciprocal() {
    // Port, 1 kΩ to node 2 with a tiny load there, which is followed by a source of node 3's
    // current.
    branch(0, 2, ElementKind.RESISTANCE, 1e3);
    branch(2, COMMON, ElementKind.RESISTANCE, 1e3);
    transconductance(2, COMMON, 0, COMMON, 1e-3);
    load(2, COMMON, ElementKind.CONDUCTANCE, 1e-15);
    Solutions found = solve(3, 1);
    // With g₂ at node 2: v₂ = g/(g + g₂), Y = g·g₂/(g + g₂) + gm·v₂ = g(g₂ + gm)/(g + g₂), g = gm.
    assertThat(found.without().re(0)).isCloseTo(1e3, within(1e-12));
    // Y'/Y − 1 = (g₂' + g)(g + g₂)/((g₂ + g)(g + g₂')) − 1 = 0 for g = gm.
    assertThat(found.change().re(0)).isCloseTo(0, within(1e-25));
    constraints.clear();
    transconductance(2, COMMON, 0, COMMON, 3e-3);
    found = solve(3, 1);
    // Z = (g + g₂)/(g(g₂ + gm)): Z'/Z − 1 = d(gm − g)/((g + g₂)(g₂ + gm + d)), d the load.
    double expected = 1e-15 * 2e-3 / (2e-3 * (4e-3 + 1e-15));
    assertThat(found.change().re(0) / expected).isCloseTo(1, TIGHT);
    assertThat(found.change().error(0)).isLessThan(1e-14);
  }
}
