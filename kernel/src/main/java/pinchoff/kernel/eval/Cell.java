package pinchoff.kernel.eval;

/**
 * A cell to run.
 *
 * @param number the number that the front end shows beside it
 * @param code its Java source
 */
public record Cell(int number, String code) {}
