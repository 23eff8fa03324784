package pinchoff.formula;

import java.math.BigDecimal;
import java.util.Optional;
import pinchoff.formula.Expression.Amount;
import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Negative;

/** An exponent that is known when it is read: a quotient of small whole numbers. */
record Ratio(int numerator, int denominator) {
  private static final int LARGEST = 1000;

  static Optional<Ratio> of(Expression e) {
    if (e instanceof Amount amount && amount.written().matches("[0-9.]{1,8}")) {
      return decimal(new BigDecimal(amount.written()));
    } else if (e instanceof Negative n) {
      return of(n.operand()).map(r -> new Ratio(-r.numerator, r.denominator));
    } else if (e instanceof Binary b && b.operator() == Operator.OVER) {
      return of(b.left()).flatMap(l -> of(b.right()).flatMap(r -> quotient(l, r)));
    }
    return Optional.empty();
  }

  private static Optional<Ratio> decimal(BigDecimal value) {
    int scale = Math.max(0, value.stripTrailingZeros().scale());
    if (scale > 3 || value.compareTo(BigDecimal.valueOf(LARGEST)) > 0) {
      return Optional.empty();
    }
    int denominator = BigDecimal.ONE.scaleByPowerOfTen(scale).intValueExact();
    return Optional.of(
        new Ratio(value.scaleByPowerOfTen(scale).intValueExact(), denominator).reduced());
  }

  private static Optional<Ratio> quotient(Ratio left, Ratio right) {
    long n = (long) left.numerator * right.denominator;
    long d = (long) left.denominator * right.numerator;
    return d == 0 || Math.abs(n) > LARGEST * LARGEST || Math.abs(d) > LARGEST * LARGEST
        ? Optional.empty()
        : Optional.of(new Ratio((int) n, (int) d).reduced());
  }

  private Ratio reduced() {
    int divisor = Math.max(1, gcd(Math.abs(numerator), Math.abs(denominator)));
    int sign = denominator < 0 ? -1 : 1;
    return new Ratio(sign * numerator / divisor, sign * denominator / divisor);
  }

  private static int gcd(int a, int b) {
    return b == 0 ? a : gcd(b, a % b);
  }
}
