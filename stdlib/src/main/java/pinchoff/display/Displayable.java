package pinchoff.display;

/** A result that shows itself in a notebook when it is the value of a cell. */
public interface Displayable {

  /**
   * All forms of this result, from plain text to HTML and pictures. A front end shows one of them,
   * HTML before pictures, so the HTML of a composite result is complete by itself.
   *
   * @return the forms; {@code text/plain} is always among them
   */
  MimeBundle display();
}
