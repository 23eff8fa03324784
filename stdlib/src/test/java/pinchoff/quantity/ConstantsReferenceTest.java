package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.testing.Close;
import pinchoff.testing.ReferenceTable;

class ConstantsReferenceTest {
  private static final Map<String, Quantity> VALUES =
      Map.of(
          "q", Constants.ELEMENTARY_CHARGE,
          "k", Constants.BOLTZMANN,
          "eps_0", Constants.VACUUM_PERMITTIVITY,
          "kT/q at 300 K", Constants.thermalVoltage(Temperature.ofKelvin(300)),
          "k/q", Constants.BOLTZMANN.per(Constants.ELEMENTARY_CHARGE));

  static Stream<ReferenceTable.Row> constants() {
    return ReferenceTable.rows("constants");
  }

  @ParameterizedTest
  @MethodSource("constants")
  void agreesWithThePublishedValue(ReferenceTable.Row row) {
    Quantity value = VALUES.get(row.text("constant"));
    assertEquals(Unit.parse(row.text("unit")).dimension(), value.dimension());
    Close.assertRelative(row.number("value"), value.si(), row.number("relative"), row.toString());
  }
}
