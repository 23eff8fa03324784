package pinchoff.testing;

import java.util.List;
import java.util.Random;
import java.util.function.Consumer;
import org.opentest4j.AssertionFailedError;

/**
 * Draws values for property tests. Each run of a law has its own seed, so a failure names the one
 * that repeats it: {@code -Dpinchoff.seed=…} then runs that case alone.
 */
public final class Gen {
  private static final String SEED = "pinchoff.seed";
  private static final long FIRST = 20_260_101L;

  private final Random random;

  private Gen(long seed) {
    this.random = new Random(seed);
  }

  /** A generator for one seed. */
  public static Gen seeded(long seed) {
    return new Gen(seed);
  }

  /**
   * Checks a law many times with fresh values.
   *
   * @param law what should hold, for the message
   * @param runs how often
   * @param body draws values and asserts
   */
  public static void check(String law, int runs, Consumer<Gen> body) {
    Long only = Long.getLong(SEED);
    if (only != null) {
      body.accept(seeded(only));
      return;
    }
    for (long seed = FIRST; seed < FIRST + runs; seed++) {
      try {
        body.accept(seeded(seed));
      } catch (AssertionError | RuntimeException failure) {
        String message = law + " fails; repeat with -D" + SEED + "=" + seed + ": " + failure;
        throw new AssertionFailedError(message, failure);
      }
    }
  }

  /** A whole number, both ends included. */
  public int between(int low, int high) {
    return low + random.nextInt(high - low + 1);
  }

  /** A number from low up to high, all equally likely. */
  public double uniform(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  /** A positive number, all decades between two powers of ten equally likely. */
  public double magnitude(int lowPower, int highPower) {
    return StrictMath.pow(10, uniform(lowPower, highPower));
  }

  /** As {@link #magnitude} with either sign. */
  public double signed(int lowPower, int highPower) {
    return random.nextBoolean() ? magnitude(lowPower, highPower) : -magnitude(lowPower, highPower);
  }

  /** Any finite double, all bit patterns equally likely. */
  public double anyFinite() {
    double value = Double.longBitsToDouble(random.nextLong());
    return Double.isFinite(value) ? value : anyFinite();
  }

  /** A decimal number with some significant digits, as people write it. */
  public double decimal(int digits, int lowPower, int highPower) {
    StringBuilder text = new StringBuilder(random.nextBoolean() ? "-0." : "0.");
    text.append(between(1, 9));
    for (int i = 1; i < digits; i++) {
      text.append(between(0, 9));
    }
    return Double.parseDouble(text + "e" + between(lowPower, highPower));
  }

  /** True with a probability. */
  public boolean chance(double probability) {
    return random.nextDouble() < probability;
  }

  /** One of some values. */
  public <T> T pick(List<T> values) {
    return values.get(random.nextInt(values.size()));
  }

  /** Text of characters picked from an alphabet, 0 to a number of them. */
  public String text(String alphabet, int most) {
    int length = between(0, most);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < length; i++) {
      text.append(alphabet.charAt(random.nextInt(alphabet.length())));
    }
    return text.toString();
  }

  /** Text of any UTF-16 units, lone surrogates and controls among them. */
  public String anyText(int most) {
    int length = between(0, most);
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < length; i++) {
      int range = chance(0.5) ? 0x80 : 0x10000;
      text.append((char) random.nextInt(range));
    }
    return text.toString();
  }
}
