package pinchoff.page;

import static pinchoff.page.Relation.amount;
import static pinchoff.page.Relation.call;
import static pinchoff.page.Relation.difference;
import static pinchoff.page.Relation.equal;
import static pinchoff.page.Relation.fraction;
import static pinchoff.page.Relation.number;
import static pinchoff.page.Relation.power;
import static pinchoff.page.Relation.product;
import static pinchoff.page.Relation.root;
import static pinchoff.page.Relation.sum;
import static pinchoff.page.Relation.symbol;
import static pinchoff.quantity.Units.quantity;

import java.util.Base64;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Temperature;
import pinchoff.quantity.Unit;

/** Pages for tests, with invented figures, that use every kind of block and entry. */
final class Samples {
  private static final String PIXEL =
      "iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNkYPhfDwAChwGA60e6kgAAAABJRU5ErkJggg==";

  private Samples() {}

  /** One transparent pixel. */
  static Picture pixel() {
    return Picture.png(
        Base64.getDecoder().decode(PIXEL), 320, 200, "Drain current of M1 against V_DS");
  }

  /** I_D of the square law with channel-length modulation. */
  static Relation squareLaw() {
    return equal(
        symbol("I_D"),
        product(
            fraction(number(1), number(2)),
            symbol("k'_n"),
            fraction(symbol("W"), symbol("L")),
            power(symbol("V_OV"), 2),
            sum(number(1), product(symbol("λ"), symbol("V_DS")))));
  }

  /** The overdrive from a current, with numbers. */
  static Relation overdrive() {
    return equal(
        symbol("V_OV"),
        root(
            fraction(
                product(number(2), symbol("I_D")),
                product(symbol("k'_n"), fraction(symbol("W"), symbol("L"))))),
        root(
            fraction(
                product(number(2), amount(quantity("21.34 uA"))),
                product(amount(quantity("387 uA/V^2")), number(4)))));
  }

  /** The body effect. */
  static Relation bodyEffect() {
    return equal(
        symbol("V_TH"),
        sum(
            symbol("V_TH0"),
            product(
                symbol("γ"),
                difference(root(sum(symbol("2φ_F"), symbol("V_SB"))), root(symbol("2φ_F"))))));
  }

  /** The all-region current, with a function in it. */
  static Relation inversion() {
    return equal(
        symbol("i"),
        power(call("ln", sum(number(1), call("exp", fraction(symbol("v_p"), number(2))))), 2));
  }

  /** A list of unlike figures. */
  static Table sheet() {
    return Table.sheet()
        .group("Bias")
        .line(Symbol.of("V_GS"), quantity("650 mV"))
        .line(Symbol.of("V_DS"), quantity("1 V"))
        .line(Symbol.of("V_SB"), quantity("0 V"), "source and body tied")
        .line(Symbol.of("I_D"), quantity("21.3417 uA"), "into the drain")
        .group("Region")
        .line("region", "saturation")
        .line(
            Symbol.of("V_OV"),
            quantity("165.961 mV"),
            Phrase.of("{} at this {}", Symbol.of("V_TH"), Symbol.of("V_SB")))
        .line(Symbol.of("V_DS,sat"), quantity("165.961 mV"))
        .line("margin", Verdict.holds(quantity("834.039 mV")).saying("in saturation"))
        .line(Symbol.of("IC"), quantity("8.216"), "moderate to strong inversion")
        .group("Small signal")
        .line(Symbol.of("g_m"), quantity("257.181 uS"))
        .line(Symbol.of("g_ds"), quantity("1.9402 uS"))
        .line(Symbol.of("r_o"), quantity("515.411 kohm"))
        .line(Symbol.of("g_m/I_D"), quantity("12.0506 1/V"))
        .line(Symbol.of("f_T"), quantity("2.31755 GHz"))
        .line(Symbol.of("γ"), quantity("450 mV^0.5").to("√V"))
        .line(Symbol.of("k'_n"), quantity("387 uA/V^2"))
        .line("leakage", quantity("-1.602e-19 A"))
        .line("temperature", Temperature.ofCelsius(27))
        .line("iterations", 7)
        .build();
  }

  /** A swept table. */
  static Table sweep() {
    Table.Builder table =
        Table.of(
                Column.of(Symbol.of("V_GS")).shared(),
                Column.of(Symbol.of("I_D")).in(Unit.parse("uA")),
                Column.of(Symbol.of("g_m/I_D")).shared(),
                Column.of("region"),
                Column.of("in saturation"),
                Column.of("steps").atEnd())
            .caption("Transfer of M1 at {} = {}", Symbol.of("V_DS"), quantity("1 V"))
            .note("{} = 0, nominal corner, {}", Symbol.of("V_SB"), Temperature.ofCelsius(27));
    String[][] rows = {
      {"500 mV", "1.2345 uA", "24.31 1/V", "weak inversion"},
      {"550 mV", "4.71828 uA", "20.2 1/V", "moderate inversion"},
      {"600 mV", "11.6 uA", "15.9004 1/V", "moderate inversion"},
      {"650 mV", "21.3417 uA", "12.0506 1/V", "strong inversion"},
      {"1.8 V", "412.007 uA", "1.75 1/V", "strong inversion"}
    };
    for (int i = 0; i < rows.length; i++) {
      String[] row = rows[i];
      table.row(
          quantity(row[0]),
          quantity(row[1]),
          quantity(row[2]),
          row[3],
          i == 4
              ? Verdict.fails(quantity("-121 mV"))
              : Verdict.holds(quantity("900 mV").minus(quantity("50 mV").times(i))),
          3 + i);
    }
    return table.build();
  }

  /** Specs with limits. */
  static Table specs() {
    return Table.of(
            Column.of("spec"),
            Column.of("min"),
            Column.of("typ"),
            Column.of("max"),
            Column.of("value"),
            Column.of("verdict"))
        .row(
            Phrase.of("{} of M1", Symbol.of("I_D")),
            quantity("18 uA"),
            quantity("20 uA"),
            quantity("22 uA"),
            quantity("21.3417 uA"),
            Verdict.holds(quantity("658.3 nA")))
        .row("gain", quantity("40"), "—", "—", quantity("38.2"), Verdict.fails(quantity("-1.8")))
        .row("noise", "—", "—", quantity("40 nV/√Hz"), quantity("40 nV/√Hz"), Verdict.edge())
        .row("offset", "—", quantity("0 V"), quantity("5 mV"), "not computed", Verdict.unknown())
        .build();
  }

  /** A page with everything. */
  static Page everything() {
    return Page.titled("Bias point of {}: {}", "M1", Symbol.of("core-n"))
        .verdict(
            Verdict.holds(quantity("834.039 mV")).saying("in saturation"),
            "M1, {} / {}",
            quantity("4 um"),
            quantity("1 um"))
        .trust(
            Standing.EDGE,
            "the square law is {} above the all-region model at {} = {}.",
            quantity("6.2 %"),
            Symbol.of("IC"),
            quantity("8.216"))
        .table(sheet())
        .caution(
            "the source-body junction is forward biased by {}: {} would flow into the body, which the channel model leaves out.",
            quantity("350 mV"),
            quantity("12.4 nA"))
        .heading("How {} follows from {}", Symbol.of("V_OV"), Symbol.of("I_D"))
        .prose(
            "The drain current is given, so the square law is solved for the overdrive. Terms with {} are left out here and put back in the last step, where they change {} by {}.",
            Symbol.of("λ"),
            Symbol.of("V_OV"),
            quantity("-1.4 mV"))
        .relation(squareLaw())
        .relation(overdrive())
        .relation(bodyEffect())
        .relation(inversion())
        .table(sweep())
        .picture(
            pixel(),
            "{} against {}, edge of saturation dashed",
            Symbol.of("I_D"),
            Symbol.of("V_DS"))
        .verdict(Verdict.fails(quantity("-12 mV")), "M2")
        .verdict(Verdict.edge(), "M3")
        .verdict(Verdict.unknown(), "M4")
        .trust(Standing.FAILS, "the square law does not apply in weak inversion.")
        .fold(
            "Specs and residuals",
            details ->
                details
                    .table(specs())
                    .prose("Residual {} after {} steps.", quantity("1.2e-17 A"), 7)
                    .value(
                        Value.spec(
                            "spec/I_D of M1",
                            "I_D of M1",
                            quantity("21.3417 uA"),
                            Limits.between(quantity("18 uA"), quantity("22 uA")),
                            Verdict.holds(quantity("658.3 nA")))))
        .value(Value.figure("M1/V_OV", "V_OV", quantity("165.961 mV")).from("sqrt(2*I_D/(k*W/L))"))
        .value(
            Value.verdict("M1/region", "M1 in saturation", Verdict.holds(quantity("834.039 mV"))))
        .value(
            Value.claim("claim/R_B", "R_B", quantity("53.7 kohm"))
                .within(pinchoff.quantity.Tolerance.relative(0.001, quantity("1 ohm").dimension()))
                .sensitiveTo("V_DD", quantity("53.7 kohm").per(quantity("1.8 V"))))
        .value(
            Value.caution("M1/body", "body diode", "source-body junction forward biased by 350 mV"))
        .premise(new ValuesSheet.Premise("V_DD", quantity("1.8 V"), false))
        .technology("larch180.tech.json", "sha256:0f3a")
        .completeness(9, 9)
        .build();
  }
}
