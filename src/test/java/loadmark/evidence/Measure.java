package loadmark.evidence;

import java.util.function.DoubleFunction;
import org.apache.commons.math3.complex.Complex;

/**
 * What a limit measures, worked out from impedances by its definition alone.
 *
 * @param kind as the report names it
 * @param value in the unit of the report
 * @param strain at most 1 where the limit is kept, and largest at the worst frequency
 */
record Measure(String kind, Law value, Law strain) {

  interface Law {
    double of(Complex with, Complex without, double hz);
  }

  private static Measure of(String kind, Law value, double bound) {
    return new Measure(kind, value, (w, b, hz) -> value.of(w, b, hz) / bound);
  }

  static Measure change(double bound) {
    return of("change", (w, b, hz) -> ClosedForm.change(w, b), bound);
  }

  static Measure changeOhm(double bound) {
    return of("change", (w, b, hz) -> w.subtract(b).abs(), bound);
  }

  /** The easier of the two at each frequency; the value is the relative one. */
  static Measure changeOr(double bound, double ohm) {
    return new Measure(
        "change",
        (w, b, hz) -> ClosedForm.change(w, b),
        (w, b, hz) -> Math.min(ClosedForm.change(w, b) / bound, w.subtract(b).abs() / ohm));
  }

  static Measure magnitudeChange(double bound) {
    return of("magnitude change", (w, b, hz) -> Math.abs(w.abs() / b.abs() - 1), bound);
  }

  static Measure phaseChange(double degrees) {
    return of("phase change", (w, b, hz) -> Math.abs(ClosedForm.degrees(w.divide(b))), degrees);
  }

  static Measure magnitude(double from, double to) {
    return window("magnitude", (w, b, hz) -> w.abs(), from, to);
  }

  static Measure magnitudeBelow(double to) {
    return of("magnitude", (w, b, hz) -> w.abs(), to);
  }

  static Measure phase(double from, double to) {
    return new Measure(
        "phase",
        (w, b, hz) -> ClosedForm.degrees(w),
        (w, b, hz) -> 1 + Math.max(from - ClosedForm.degrees(w), ClosedForm.degrees(w) - to));
  }

  static Measure magnitudeWithin(double bound, DoubleFunction<Complex> reference) {
    return of(
        "magnitude within", (w, b, hz) -> Math.abs(w.abs() / reference.apply(hz).abs() - 1), bound);
  }

  static Measure phaseWithin(double degrees, DoubleFunction<Complex> reference) {
    return of(
        "phase within",
        (w, b, hz) -> Math.abs(ClosedForm.degrees(w.divide(reference.apply(hz)))),
        degrees);
  }

  static Measure parallelResistance(double from, double to) {
    return window("parallel resistance", (w, b, hz) -> 1 / w.reciprocal().getReal(), from, to);
  }

  static Measure parallelCapacitance(double from, double to) {
    return window(
        "parallel capacitance",
        (w, b, hz) -> w.reciprocal().getImaginary() / (2 * Math.PI * hz),
        from,
        to);
  }

  static Measure returnLoss(double decibels, double ohm) {
    Law value = (w, b, hz) -> ClosedForm.returnLoss(w, new Complex(ohm));
    return new Measure(
        "return loss", value, (w, b, hz) -> 1 + (decibels - value.of(w, b, hz)) / decibels);
  }

  private static Measure window(String kind, Law value, double from, double to) {
    return new Measure(
        kind, value, (w, b, hz) -> Math.max(value.of(w, b, hz) / to, from / value.of(w, b, hz)));
  }
}
