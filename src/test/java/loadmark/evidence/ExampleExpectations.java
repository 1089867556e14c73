package loadmark.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** What every limit of every example is meant to come to: its scope, its bound, its verdict. */
final class ExampleExpectations {
  private static final boolean KEPT = true;
  private static final boolean BROKEN = false;

  /** The verdict on each file. */
  static final Map<String, Boolean> FILES =
      Map.ofEntries(
          Map.entry("battery-divider", KEPT),
          Map.entry("resonator-probe", BROKEN),
          Map.entry("sensor-loop-burden", BROKEN),
          Map.entry("attenuator-termination", BROKEN),
          Map.entry("harmonic-filter", BROKEN),
          Map.entry("mains-network", BROKEN),
          Map.entry("far-port", BROKEN),
          Map.entry("probe-added", BROKEN),
          Map.entry("current-loop", BROKEN),
          Map.entry("one-sided-pad", BROKEN),
          Map.entry("pickup-cable", BROKEN),
          Map.entry("supply-rail", BROKEN),
          Map.entry("powered-device", KEPT),
          Map.entry("strain-bridge", KEPT),
          Map.entry("thermistor-tap", BROKEN),
          Map.entry("touch-current", KEPT));

  private final List<Expectation> all = new ArrayList<>();
  private String example = "";
  private Expectation.Seen seen = ExampleImpedances::batteryDivider;
  private String port = "";

  private ExampleExpectations() {}

  static List<Expectation> all() {
    ExampleExpectations e = new ExampleExpectations();
    e.loadsAlone();
    e.loadsTogether();
    e.windows();
    e.singleFrequencies();
    return List.copyOf(e.all);
  }

  private void loadsAlone() {
    at("battery-divider", ExampleImpedances::batteryDivider, "pack_side");
    alone("converter", KEPT, 1, 1e6, Measure.change(0.01)); // 0.00470 at 1 Hz
    alone("converter", KEPT, 1, 10e3, Measure.magnitude(300e3, 420e3)); // 375.4 kΩ at 1 Hz
    at("battery-divider", ExampleImpedances::batteryDivider, "tap_side");
    alone("converter", KEPT, 1, 1e6, Measure.change(0.05)); // 0.0331 at 1 Hz

    at("resonator-probe", ExampleImpedances::resonatorProbe, "tank");
    alone("passive", BROKEN, 4e6, 6e6, Measure.change(0.2)); // 1.218 at 4.893 MHz
    alone("active", KEPT, 4e6, 6e6, Measure.change(0.2)); // 0.0910 at 4.946 MHz

    at("sensor-loop-burden", ExampleImpedances::sensorLoop, "amplifier");
    alone("bench", KEPT, 1, 10e3, Measure.change(0.01)); // 0.00466 at 1 Hz
    alone("bench", KEPT, 1, 10e3, Measure.phaseChange(2));
    alone("handheld", BROKEN, 1, 10e3, Measure.change(0.01)); // 0.0272 at 1 Hz, to 3.108 kHz
    alone("handheld", KEPT, 1, 10e3, Measure.phaseChange(2));

    at("pickup-cable", ExampleImpedances::pickupCable, "jack");
    alone("guitar_lead", KEPT, 80, 1.2e3, Measure.magnitudeChange(0.1)); // 0.0570 at 1.2 kHz
    alone("patch_lead", KEPT, 80, 1.2e3, Measure.magnitudeChange(0.1)); // 0.0830 at 1.2 kHz
    add(
        "all",
        Set.of("guitar_lead", "patch_lead"),
        Set.of(),
        0,
        BROKEN,
        80,
        1.2e3,
        Measure.magnitudeChange(0.1));

    at("far-port", ExampleImpedances::farPort, "connector");
    alone("probe", KEPT, 10, 1e6, Measure.change(0.01)); // 0.00314 at 10 Hz
    alone("probe", KEPT, 10, 20e3, Measure.phaseChange(5)); // 0.0726° at 20 kHz
    at("far-port", ExampleImpedances::farPort, "node");
    alone("probe", BROKEN, 10, 1e6, Measure.change(0.05)); // 0.855 at 1 MHz, from 29.5 kHz
    alone("probe", KEPT, 10, 20e3, Measure.phaseChange(5)); // 1.96° at 20 kHz

    at("touch-current", ExampleImpedances::touchCurrent, "hand");
    alone("meter", KEPT, 20, 1e6, Measure.change(1e-3)); // 0.0001348 at 673 Hz
    at("touch-current", ExampleImpedances::touchCurrent, "output");
    alone("meter", KEPT, 20, 1e6, Measure.change(0.02)); // 0.0104 at 20 Hz
  }

  private void loadsTogether() {
    at("attenuator-termination", ExampleImpedances::attenuator, "generator");
    Set<String> fifty = Set.of("fifty");
    Measure loss = Measure.returnLoss(26, 50);
    add("right", fifty, Set.of(), 0, KEPT, 1e3, 100e6, loss); // 53.84 dB
    add("video", Set.of("seventy_five"), fifty, 0, KEPT, 1e3, 100e6, loss); // 35.06 dB
    add("video", Set.of("seventy_five"), fifty, 0, KEPT, 1e3, 100e6, Measure.change(0.05));
    add("open_end", Set.of("scope"), fifty, 0, BROKEN, 1e3, 100e6, loss); // 20.2 dB
    add("open_end", Set.of("scope"), fifty, 0, BROKEN, 1e3, 100e6, Measure.change(0.05));

    at("probe-added", ExampleImpedances::probeAdded, "tap");
    Set<String> converter = Set.of("converter");
    add("working", converter, Set.of(), 0, KEPT, 10, 1e6, Measure.change(0.1)); // 0.0598
    add(
        "on_passive",
        Set.of("converter", "passive"),
        converter,
        0,
        BROKEN,
        10,
        1e6,
        Measure.change(0.03)); // 0.0390 at 1 MHz, from 48.9 kHz
    add(
        "on_active",
        Set.of("converter", "active"),
        converter,
        0,
        KEPT,
        10,
        1e6,
        Measure.change(0.03)); // 0.0158 at 10 Hz

    at("thermistor-tap", ExampleImpedances::thermistorTap, "sense");
    Measure window = Measure.magnitude(6e3, 7.5e3);
    Set<String> both = Set.of("logger", "meter");
    alone("logger", KEPT, 1, 100e3, Measure.change(0.007)); // 0.00683 at 1 Hz
    alone("logger", KEPT, 1, 100, window);
    alone("meter", KEPT, 1, 100e3, Measure.change(0.007)); // 0.00596 at 100 kHz
    alone("meter", KEPT, 1, 100, window);
    add("all", both, Set.of(), 0, BROKEN, 1, 100e3, Measure.change(0.007)); // 0.00751 at 1 Hz
    add("all", both, Set.of(), 0, KEPT, 1, 100, window);
  }

  private void windows() {
    at("harmonic-filter", ExampleImpedances::harmonicFilter, "output_stage");
    alone("dummy", KEPT, 3.5e6, 3.8e6, Measure.returnLoss(16, 50)); // 16.41 dB at 3.8 MHz
    alone("dummy", KEPT, 3.5e6, 3.8e6, Measure.magnitude(30, 75)); // 65.88 Ω at 3.8 MHz
    alone("aerial_wire", BROKEN, 3.5e6, 3.8e6, Measure.returnLoss(16, 50)); // 10.3 dB
    alone("aerial_wire", BROKEN, 3.5e6, 3.8e6, Measure.magnitude(30, 75)); // 83.90 Ω

    at("mains-network", ExampleImpedances::mainsNetwork, "terminal");
    Measure magnitude = Measure.magnitudeWithin(0.2, ExampleImpedances::mainsReference);
    Measure phase = Measure.phaseWithin(11.5, ExampleImpedances::mainsReference);
    Set<String> receiver = Set.of("receiver");
    add("measuring", receiver, Set.of(), 0, KEPT, 9e3, 150e3, magnitude); // 0.0668 at 38 kHz
    add("measuring", receiver, Set.of(), 0, KEPT, 9e3, 150e3, phase); // 5.44° at 9 kHz
    add("bare", Set.of(), Set.of(), 0, BROKEN, 9e3, 150e3, magnitude);
    add("bare", Set.of(), Set.of(), 0, BROKEN, 9e3, 150e3, phase);

    at("one-sided-pad", ExampleImpedances::oneSidedPad, "side_75");
    add("bare", Set.of(), Set.of(), 0, KEPT, 1e6, 500e6, Measure.returnLoss(20, 75));
    add("bare", Set.of(), Set.of(), 0, KEPT, 1e6, 500e6, Measure.phase(-2, 2));
    at("one-sided-pad", ExampleImpedances::oneSidedPad, "side_50");
    add("bare", Set.of(), Set.of(), 0, BROKEN, 1e6, 500e6, Measure.returnLoss(20, 50));

    at("supply-rail", ExampleImpedances::supplyRail, "chip");
    alone("module", BROKEN, 1e3, 30e6, Measure.magnitudeBelow(25e-3)); // 0.155 Ω at 4.51 MHz

    at("powered-device", ExampleImpedances::poweredDevice, "detection");
    Measure farads = Measure.parallelCapacitance(50e-9, 120e-9);
    alone("clamp", KEPT, 1, 100, Measure.parallelResistance(23.75e3, 26.25e3));
    alone("clamp", KEPT, 1, 100, farads);
    alone("lamp", KEPT, 1, 100, Measure.parallelResistance(23.75e3, 26.25e3));
    alone("lamp", KEPT, 1, 100, farads);
  }

  private void singleFrequencies() {
    at("current-loop", ExampleImpedances::currentLoop, "transmitter");
    Measure room = Measure.magnitudeBelow(12 / 21e-3);
    Set<String> barrier = Set.of("barrier");
    Set<String> both = Set.of("barrier", "indicator");
    add("with_barrier", barrier, Set.of(), 0, KEPT, 0, 0, room); // 550.4 Ω of 571.4 Ω
    add("with_indicator", Set.of("indicator"), Set.of(), 0, KEPT, 0, 0, room); // 322.4 Ω
    add("retrofit", both, barrier, 0, BROKEN, 0, 0, room); // 602.4 Ω
    add("retrofit", both, barrier, 0, KEPT, 0, 0, Measure.changeOhm(60)); // 52 Ω

    at("strain-bridge", ExampleImpedances::strainBridge, "signal");
    Set<String> amplifier = Set.of("amplifier");
    Measure easier = Measure.changeOr(0.005, 2);
    add("amplifier", amplifier, Set.of(), 0, KEPT, 50, 1e3, easier); // 0.00364 at 1 kHz
    add("amplifier", amplifier, Set.of(), 1, KEPT, 20e3, 20e3, Measure.changeOhm(8)); // 7.318 Ω
    add("amplifier", amplifier, Set.of(), 2, KEPT, 0, 0, Measure.change(0.005)); // 0.00349
  }

  private void at(String file, Expectation.Seen impedance, String portName) {
    example = file;
    seen = impedance;
    port = portName;
  }

  private void alone(String load, boolean kept, double from, double to, Measure measure) {
    add(load, Set.of(load), Set.of(), 0, kept, from, to, measure);
  }

  private void add(
      String caseName,
      Set<String> loads,
      Set<String> against,
      int which,
      boolean kept,
      double from,
      double to,
      Measure measure) {
    all.add(
        new Expectation(
            example, seen, caseName, port, loads, against, which, kept, from, to, measure));
  }
}
