package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import javax.measure.Quantity;
import org.junit.jupiter.api.Test;
import pinchoff.testing.Close;
import pinchoff.testing.Gen;
import tech.units.indriya.ComparableQuantity;
import tech.units.indriya.quantity.Quantities;
import tech.units.indriya.unit.Units;

/** Arithmetic against a general-purpose units library (Indriya, an implementation of JSR 385). */
class QuantityReferenceTest {

  /** A unit in both worlds. */
  private record Pair(String ours, javax.measure.Unit<?> theirs) {}

  private static final List<Pair> UNITS =
      List.of(
          new Pair("V", Units.VOLT),
          new Pair("A", Units.AMPERE),
          new Pair("ohm", Units.OHM),
          new Pair("S", Units.SIEMENS),
          new Pair("F", Units.FARAD),
          new Pair("H", Units.HENRY),
          new Pair("Hz", Units.HERTZ),
          new Pair("s", Units.SECOND),
          new Pair("m", Units.METRE),
          new Pair("W", Units.WATT),
          new Pair("C", Units.COULOMB),
          new Pair("J", Units.JOULE),
          new Pair("K", Units.KELVIN));

  private static double si(Quantity<?> q) {
    return q.toSystemUnit().getValue().doubleValue();
  }

  private static boolean sameDimension(pinchoff.quantity.Quantity ours, Quantity<?> theirs) {
    for (Pair pair : UNITS) {
      boolean mine = ours.dimension().equals(Unit.parse(pair.ours()).dimension());
      boolean other = theirs.getUnit().isCompatible(pair.theirs());
      if (mine != other) {
        return false;
      }
    }
    return true;
  }

  @Test
  void productsQuotientsAndPowersAgree() {
    Gen.check(
        "products",
        2000,
        gen -> {
          Pair a = gen.pick(UNITS);
          Pair b = gen.pick(UNITS);
          double x = gen.signed(-9, 6);
          double y = gen.signed(-9, 6);
          var ours = pinchoff.quantity.Quantity.of(x, Unit.parse(a.ours()));
          var other = pinchoff.quantity.Quantity.of(y, Unit.parse(b.ours()));
          ComparableQuantity<?> theirs = Quantities.getQuantity(x, a.theirs());
          ComparableQuantity<?> their = Quantities.getQuantity(y, b.theirs());
          Quantity<?> product = theirs.multiply(their);
          Quantity<?> quotient = theirs.divide(their);
          Close.assertRelative(si(product), ours.times(other).si(), 1e-12, a + " times " + b);
          Close.assertRelative(si(quotient), ours.per(other).si(), 1e-12, a + " per " + b);
          assertEquals(true, sameDimension(ours.times(other), product), a + " times " + b);
          assertEquals(true, sameDimension(ours.per(other), quotient), a + " per " + b);
        });
  }

  @Test
  @SuppressWarnings({"unchecked", "rawtypes"})
  void sumsAgreeAndUnlikeOnesAreRefusedByBoth() {
    Gen.check(
        "sums",
        2000,
        gen -> {
          Pair a = gen.pick(UNITS);
          Pair b = gen.pick(UNITS);
          double x = gen.uniform(-10, 10);
          double y = gen.uniform(-10, 10);
          var ours = pinchoff.quantity.Quantity.of(x, Unit.parse(a.ours()));
          var other = pinchoff.quantity.Quantity.of(y, Unit.parse(b.ours()));
          if (a.theirs().isCompatible((javax.measure.Unit) b.theirs())) {
            Quantity sum =
                ((ComparableQuantity) Quantities.getQuantity(x, a.theirs()))
                    .add(Quantities.getQuantity(y, (javax.measure.Unit) b.theirs()));
            assertEquals(si(sum), ours.plus(other).si(), 1e-12);
          } else {
            assertThrows(QuantityException.class, () -> ours.plus(other));
          }
        });
  }
}
