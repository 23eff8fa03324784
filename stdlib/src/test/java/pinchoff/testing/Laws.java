package pinchoff.testing;

import java.util.Arrays;
import java.util.function.BiPredicate;
import java.util.function.BinaryOperator;
import java.util.function.UnaryOperator;
import org.opentest4j.AssertionFailedError;

/**
 * Laws of algebra, checked for given values. What counts as the same is the caller's to say:
 * floating-point sums associate only nearly.
 *
 * @param <T> what the operations work on
 * @param same when two results agree
 */
public record Laws<T>(BiPredicate<T, T> same) {

  /** Laws that hold to the bit. */
  public static <T> Laws<T> exact() {
    return new Laws<>(Object::equals);
  }

  /** a ∘ b = b ∘ a. */
  public void commutes(BinaryOperator<T> operation, T a, T b) {
    require("commutes", operation.apply(a, b), operation.apply(b, a), a, b);
  }

  /** (a ∘ b) ∘ c = a ∘ (b ∘ c). */
  public void associates(BinaryOperator<T> operation, T a, T b, T c) {
    T left = operation.apply(operation.apply(a, b), c);
    T right = operation.apply(a, operation.apply(b, c));
    require("associates", left, right, a, b, c);
  }

  /** a ∘ e = a. */
  public void identity(BinaryOperator<T> operation, T neutral, T a) {
    require("identity", a, operation.apply(a, neutral), a, neutral);
  }

  /** (a ∘ b) • b = a. */
  public void undoes(BinaryOperator<T> operation, BinaryOperator<T> inverse, T a, T b) {
    require("undoes", a, inverse.apply(operation.apply(a, b), b), a, b);
  }

  /** a • (b + c) = a • b + a • c. */
  public void distributes(BinaryOperator<T> product, BinaryOperator<T> sum, T a, T b, T c) {
    T left = product.apply(a, sum.apply(b, c));
    T right = sum.apply(product.apply(a, b), product.apply(a, c));
    require("distributes", left, right, a, b, c);
  }

  /** f(f(a)) = a. */
  public void involution(UnaryOperator<T> function, T a) {
    require("is its own inverse", a, function.apply(function.apply(a)), a);
  }

  /** f(f(a)) = f(a). */
  public void idempotent(UnaryOperator<T> function, T a) {
    T once = function.apply(a);
    require("changes nothing when repeated", once, function.apply(once), a);
  }

  private void require(String law, T expected, T actual, Object... values) {
    if (!same.test(expected, actual)) {
      throw new AssertionFailedError(
          "law \"" + law + "\" for " + Arrays.toString(values), expected, actual);
    }
  }
}
