package loadmark.touchstone;

/** How a pair of numbers writes a complex one; angles are in degrees. */
enum Notation {
  /** Real and imaginary part. */
  RI,
  /** Magnitude and angle. */
  MA,
  /** Magnitude in dB, as 20·log10, and angle. */
  DB;

  private static final double FULL_TURN = 360;
  private static final double HALF_TURN = 180;
  private static final double RIGHT_ANGLE = 90;
  private static final double DECIBELS_A_DECADE = 20;

  double re(double first, double second) {
    return this == RI ? first : magnitude(first) * cosine(second);
  }

  double im(double first, double second) {
    return this == RI ? second : magnitude(first) * sine(second);
  }

  /** Whether no complex number is written so. */
  boolean refuses(double first) {
    return this == MA && first < 0;
  }

  private double magnitude(double first) {
    return this == DB ? Math.pow(10, first / DECIBELS_A_DECADE) : first;
  }

  /** Exactly 0, 1 or −1 at whole right angles, so that 1∠180° is a short and 1∠0° an open. */
  private static double cosine(double degrees) {
    double angle = Math.abs(Math.IEEEremainder(degrees, FULL_TURN));
    return angle > RIGHT_ANGLE ? -acuteCosine(HALF_TURN - angle) : acuteCosine(angle);
  }

  private static double sine(double degrees) {
    double turned = Math.IEEEremainder(degrees, FULL_TURN);
    double angle = Math.abs(turned);
    double acute = angle > RIGHT_ANGLE ? HALF_TURN - angle : angle;
    return Math.copySign(1, turned) * acuteSine(acute);
  }

  private static double acuteCosine(double degrees) {
    return acuteSine(RIGHT_ANGLE - degrees);
  }

  private static double acuteSine(double degrees) {
    return degrees > RIGHT_ANGLE / 2
        ? Math.cos(Math.toRadians(RIGHT_ANGLE - degrees))
        : Math.sin(Math.toRadians(degrees));
  }
}
