package pinchoff.quantity;

/** Powers of doubles, the same to the bit on every platform. */
final class Powers {

  private Powers() {}

  /** By repeated squaring, so that the second power is the product of the value with itself. */
  static double whole(double value, long exponent) {
    long left = Math.abs(exponent);
    double power = 1;
    double square = value;
    while (left > 0) {
      power = (left & 1) == 1 ? power * square : power;
      left >>= 1;
      square = left > 0 ? square * square : square;
    }
    return exponent < 0 ? 1 / power : power;
  }

  /** NaN for a root of a negative value. */
  static double rational(double value, int numerator, int denominator) {
    long sign = denominator < 0 ? -1 : 1;
    long top = numerator * sign;
    long bottom = denominator * sign;
    if (top % bottom == 0) {
      return whole(value, top / bottom);
    }
    return top * 2 == bottom ? Math.sqrt(value) : StrictMath.pow(value, (double) top / bottom);
  }
}
