package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.apfloat.Apcomplex;
import org.junit.jupiter.api.Test;

class AccuracyTest {
  static double decade(Random random, double from, double to) {
    return from * Math.pow(to / from, random.nextDouble());
  }
  static loadmark.network.OnePort element(Random random, boolean extreme) {
    int k = random.nextInt(3);
    if (extreme) return k == 0 ? Circuit.r(decade(random, 1e-3, 1e9)) : k == 1 ? Circuit.c(decade(random, 1e-15, 1e-3)) : Circuit.l(decade(random, 1e-10, 1));
    return k == 0 ? Circuit.r(decade(random, 10, 1e5)) : k == 1 ? Circuit.c(decade(random, 1e-11, 1e-7)) : Circuit.l(decade(random, 1e-7, 1e-2));
  }
  static Circuit random(Random random, boolean extreme) {
    Circuit circuit = new Circuit();
    int n = 2 + random.nextInt(12);
    for (int i = 1; i < n; i++) circuit.part(i, i + 1, element(random, extreme));
    for (int i = 1; i <= n; i++) if (i==n || random.nextInt(3) > 0) circuit.part(i, 0, element(random, extreme));
    if (random.nextBoolean()) for (int i = 0; i < n / 2; i++) { int a = random.nextInt(n + 1), b = random.nextInt(n + 1); if (a != b) circuit.part(a, b, element(random, extreme)); }
    circuit.port(1, 0);
    int loads = 1 + random.nextInt(2);
    for (int i = 0; i < loads; i++) {
      int a = 1 + random.nextInt(n), b = random.nextInt(4) == 0 ? random.nextInt(n + 1) : 0;
      if (a != b) circuit.shunt(a, b, Circuit.parallel(element(random, extreme), element(random, extreme)));
      else circuit.shunt(a, 0, element(random, extreme));
    }
    return circuit;
  }
  @Test
  void sample() {
    for (boolean extreme : new boolean[] {false, true}) {
      double worstZ = 0, worstH = 0, worstRatio = 0; List<Double> over = new ArrayList<>(), overH = new ArrayList<>(); int undetermined = 0;
      long t0 = 0; long oracle = 0;
      int count = Integer.getInteger("count", 100);
      int below = 0;
      for (int seed = 0; seed < count; seed++) {
        Random random = new Random(seed);
        Circuit circuit = random(random, extreme);
        double hz = extreme ? decade(random, 0.1, 1e10) : decade(random, 1e2, 1e7);
        Loading at = circuit.compare().at(hz);
        long t = System.nanoTime();
        ExactNetwork without = new ExactNetwork(circuit.network(), List.of(), hz);
        ExactNetwork with = new ExactNetwork(circuit.network(), circuit.network().loads(), hz);
        Apcomplex z = without.solve();
        Apcomplex zl = with.solve();
        oracle += System.nanoTime() - t;
        double k = without.condition(z);
        double kl = with.condition(zl);
        if (!at.without().isFinite() || !at.with().isFinite() || !at.change().isFinite()) { undetermined++; System.out.println("seed " + seed + " " + at); continue; }
        double e = error(z, at.without().re(), at.without().im());
        double el = error(zl, at.with().re(), at.with().im());
        Apcomplex h = zl.divide(z).subtract(new Apcomplex(new org.apfloat.Apfloat(1, 110)));
        double eh = error(h, at.change().re(), at.change().im());
        worstZ = Math.max(worstZ, Math.max(e / k, el / kl) / 0x1p-53);
        worstH = Math.max(worstH, eh);
        double unit = 0x1p-53;
        over.add(at.withoutError() / Math.max(e, unit)); over.add(at.withError() / Math.max(el, unit)); overH.add(at.changeError() / Math.max(eh, unit));
        if (e > at.withoutError() || el > at.withError() || eh > at.changeError()) { below++; System.out.println("BELOW seed " + seed + " e " + e + " " + el + " " + eh + " at " + at+" k "+k+" "+kl); }
        if (eh > 1e-9 || e > 1000 * k * unit) System.out.println("BAD seed " + seed + " hz " + hz + " e " + e + " " + el + " " + eh + " k " + k + " " + kl + " H " + ExactNetwork.abs(h) + " " + at);
      }
      over.sort(null); overH.sort(null);
      System.out.printf("extreme %s: worst Z error/(k u) %.3g worst H error %.3g below %d undetermined %d; over Z median %.3g p90 %.3g max %.3g; H %.3g %.3g %.3g; oracle %.1f ms each%n", extreme, worstZ, worstH, below, undetermined, over.get(over.size()/2), over.get(over.size()*9/10), over.get(over.size()-1), overH.get(overH.size()/2), overH.get(overH.size()*9/10), overH.get(overH.size()-1), oracle/1e6/count);
    }
  }
  static double error(Apcomplex exact, double re, double im) {
    Apcomplex d = new Apcomplex(ExactNetwork.exact(re), ExactNetwork.exact(im)).subtract(exact);
    return ExactNetwork.abs(exact) == 0 ? ExactNetwork.abs(d) : ExactNetwork.abs(d.divide(exact));
  }
}
