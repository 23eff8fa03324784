package pinchoff.page;

import java.util.Optional;
import pinchoff.quantity.Unit;

/**
 * A column of a table: its heading, and how the entries below it stand.
 *
 * <p>Columns of quantities need no setting: decimal marks stand under each other, and units have a
 * place of their own.
 *
 * @param heading what stands above
 * @param alignment where text entries stand; numbers stand by their decimal marks
 * @param units whether each quantity has its own unit or all share one
 * @param unit the unit that all share, if it is chosen
 */
public record Column(Phrase heading, Alignment alignment, UnitStyle units, Optional<Unit> unit) {

  /** Where the entries of a column stand. */
  public enum Alignment {
    /** At the left. */
    START,
    /** In the middle. */
    CENTER,
    /** At the right. */
    END
  }

  /** How a column of quantities shows units. */
  public enum UnitStyle {
    /** Each quantity beside its own unit: right for a list of unlike figures. */
    OWN,
    /** One unit for all, in the heading: right for a swept table. */
    SHARED
  }

  /** A column with a heading in words. */
  public static Column of(String heading) {
    return of(Phrase.plain(heading));
  }

  /** A column with a symbol for a heading. */
  public static Column of(Symbol heading) {
    return of(Phrase.of(heading));
  }

  /** A column with a sentence for a heading. */
  public static Column of(Phrase heading) {
    return new Column(heading, Alignment.START, UnitStyle.OWN, Optional.empty());
  }

  /**
   * The same column with one unit for all quantities, picked by their size. Where they differ too
   * much in size for one unit (more than five decades), each shows its own.
   */
  public Column shared() {
    return new Column(heading, alignment, UnitStyle.SHARED, Optional.empty());
  }

  /** The same column with all quantities in this unit. */
  public Column in(Unit shared) {
    return new Column(heading, alignment, UnitStyle.SHARED, Optional.of(shared));
  }

  /** The same column with its text at the right. */
  public Column atEnd() {
    return new Column(heading, Alignment.END, units, unit);
  }

  /** The same column with its text in the middle. */
  public Column centered() {
    return new Column(heading, Alignment.CENTER, units, unit);
  }
}
