package pinchoff.formula;

import java.util.List;

/** Whatever supplies named quantities to formulas: a premise, a bias point, a derivation. */
@FunctionalInterface
public interface NamedValues {

  /** The quantities in order, no two of the same name. */
  List<NamedValue> namedValues();
}
