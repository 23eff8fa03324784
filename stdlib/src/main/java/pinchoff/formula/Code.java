package pinchoff.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToIntFunction;
import pinchoff.formula.Expression.Amount;
import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Call;
import pinchoff.formula.Expression.Named;
import pinchoff.formula.Expression.Negative;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/**
 * An expression compiled to a list of operations on doubles in SI units: quick to evaluate again
 * with other numbers, and exact in its derivatives.
 *
 * <p>Evaluation writes the result of each operation into an array of the caller's, and allocates
 * nothing. One array serves one thread.
 */
public final class Code {
  private final Op[] ops;
  private final int[] left;
  private final int[] right;
  private final double[] constants;
  private final List<Expression> origins;

  private Code(Compiler c) {
    this.ops = c.ops.toArray(new Op[0]);
    this.left = c.left.stream().mapToInt(Integer::intValue).toArray();
    this.right = c.right.stream().mapToInt(Integer::intValue).toArray();
    this.constants = c.constants.stream().mapToDouble(Double::doubleValue).toArray();
    this.origins = List.copyOf(c.origins);
  }

  /**
   * Compiles an expression whose dimensions have been checked.
   *
   * @param slots the place of each name among the inputs
   */
  public static Code of(Expression expression, ToIntFunction<String> slots) {
    Compiler compiler = new Compiler(slots);
    compiler.add(expression);
    return new Code(compiler);
  }

  /** How long the caller's array of results must be. */
  public int size() {
    return ops.length;
  }

  /**
   * Evaluates.
   *
   * @param inputs the values of the names, by their slots
   * @param results one place for each operation; the last one used is the value
   * @return the value; NaN or infinite where {@link #fault} says why
   */
  public double evaluate(double[] inputs, double[] results) {
    int last = ops.length - 1;
    double value = 0;
    for (int i = 0; i <= last; i++) {
      int l = left[i];
      // the usual operations first, without a second dispatch
      value =
          switch (ops[i]) {
            case CONSTANT -> constants[i];
            case INPUT -> inputs[l];
            case PLUS -> results[l] + results[right[i]];
            case MINUS -> results[l] - results[right[i]];
            case TIMES -> results[l] * results[right[i]];
            case OVER -> results[l] / results[right[i]];
            case SQUARE -> results[l] * results[l];
            case SQRT -> Math.sqrt(results[l]);
            default -> ops[i].value(results[l], results[right[i]]);
          };
      results[i] = value;
    }
    return value;
  }

  /** True if every operation had a finite result; to be asked after {@link #evaluate}. */
  public boolean isFinite(double[] results) {
    for (int i = 0; i < ops.length; i++) {
      if (!Double.isFinite(results[i])) {
        return false;
      }
    }
    return true;
  }

  /**
   * The derivatives of the value, by reverse accumulation; exact up to rounding.
   *
   * @param results as {@link #evaluate} left them
   * @param adjoints working space as long as the results
   * @param gradient the derivative to each input is added here
   */
  public void gradient(double[] results, double[] adjoints, double[] gradient) {
    java.util.Arrays.fill(adjoints, 0, ops.length, 0);
    adjoints[ops.length - 1] = 1;
    for (int i = ops.length - 1; i >= 0; i--) {
      double adjoint = adjoints[i];
      int l = left[i];
      int r = right[i];
      if (adjoint == 0 || ops[i] == Op.CONSTANT) {
        continue;
      } else if (ops[i] == Op.INPUT) {
        gradient[l] += adjoint;
        continue;
      }
      double a = results[l];
      double b = results[r];
      adjoints[l] += adjoint * ops[i].byLeft(a, b, results[i]);
      if (ops[i].isBinary()) {
        adjoints[r] += adjoint * ops[i].byRight(a, b, results[i]);
      }
    }
  }

  /**
   * The first operation without a finite result, as an issue at its place.
   *
   * @param results as {@link #evaluate} left them
   * @param dimensions of the names, to show values with their units
   */
  public Optional<Issue> fault(double[] results, Dimensions dimensions) {
    for (int i = 0; i < ops.length; i++) {
      if (!Double.isFinite(results[i])) {
        Expression origin = origins.get(i);
        return Optional.of(
            Issue.error(
                origin.span(),
                ops[i].fault(
                    origin,
                    operand(left[i], results, dimensions),
                    operand(right[i], results, dimensions))));
      }
    }
    return Optional.empty();
  }

  private Op.Operand operand(int index, double[] results, Dimensions dimensions) {
    Expression origin = origins.get(index);
    double value = results[index];
    String shown =
        dimensions
            .of(origin)
            .filter(d -> Double.isFinite(value))
            .map(d -> Quantity.ofSi(value, d).toString())
            .orElse("not finite");
    return new Op.Operand(origin.text(), value, shown);
  }

  /** Lists the operations, operands first. */
  private static final class Compiler {
    private final ToIntFunction<String> slots;
    private final List<Op> ops = new ArrayList<>();
    private final List<Integer> left = new ArrayList<>();
    private final List<Integer> right = new ArrayList<>();
    private final List<Double> constants = new ArrayList<>();
    private final List<Expression> origins = new ArrayList<>();

    Compiler(ToIntFunction<String> slots) {
      this.slots = slots;
    }

    int add(Expression e) {
      if (e instanceof Amount amount) {
        return emit(Op.CONSTANT, 0, 0, amount.value().si(), e);
      } else if (e instanceof Named named) {
        return emit(Op.INPUT, slots.applyAsInt(named.name()), 0, 0, e);
      } else if (e instanceof Negative n) {
        int operand = add(n.operand());
        return emit(Op.NEGATE, operand, operand, 0, e);
      } else if (e instanceof Call call) {
        int first = add(call.arguments().get(0));
        int second = call.arguments().size() > 1 ? add(call.arguments().get(1)) : first;
        return emit(Op.of(call.function()), first, second, 0, e);
      }
      Binary b = (Binary) e;
      if (b.operator() == Operator.POWER && isTwo(b.right())) {
        int base = add(b.left());
        return emit(Op.SQUARE, base, base, 0, e);
      }
      int l = add(b.left());
      return emit(Op.of(b.operator()), l, add(b.right()), 0, e);
    }

    private static boolean isTwo(Expression exponent) {
      return exponent instanceof Amount a && a.written().equals("2");
    }

    private int emit(Op op, int l, int r, double constant, Expression origin) {
      ops.add(op);
      left.add(l);
      right.add(r);
      constants.add(constant);
      origins.add(origin);
      return ops.size() - 1;
    }
  }
}
