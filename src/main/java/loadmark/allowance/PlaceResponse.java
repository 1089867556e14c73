package loadmark.allowance;

import loadmark.response.Loading;
import loadmark.response.Ohms;
import org.apache.commons.math3.complex.Complex;

/**
 * What a port does at one frequency as a function of what hangs at a load's place.
 *
 * <p>With v the admittance (S) of a shunt load, or the impedance (Ω) of a series load, so that v =
 * 0 is no load, Z_with = Z_0 + v·κ/(c + v·e): the bilinear theorem, from which the extra element
 * theorem follows (Middlebrook, Null double injection and the extra element theorem, IEEE Trans.
 * Education 32(3), 1989). c : e is 1 : z for a shunt and z : 1 for a series load, where z is the
 * impedance seen from the place with the port open.
 *
 * @param without the reference against the case without this load, whose impedance is Z_0
 * @param base c
 * @param slope e
 * @param effect κ, such that v·κ/(c + v·e) is in Ω
 */
record PlaceResponse(Loading without, Complex base, Complex slope, Complex effect) {

  double hz() {
    return without.hz();
  }

  /** Z_0: with the other loads of the case alone. */
  Complex impedance() {
    return complex(without.with());
  }

  /** The impedance that changes are told against, Ω; finite. */
  Complex reference() {
    return complex(without.without());
  }

  /** Z_0 less the reference's impedance, Ω, without cancellation where there is none. */
  Complex offset() {
    return without.change().isFinite()
        ? reference().multiply(new Complex(without.change().re(), without.change().im()))
        : impedance().subtract(reference());
  }

  static Complex complex(Ohms z) {
    if (!z.isFinite()) {
      throw new IllegalArgumentException(z.state() + " is no number");
    }
    return new Complex(z.re(), z.im());
  }
}
