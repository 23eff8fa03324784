package pinchoff.claims;

/** Names of premises, claims and specs. */
final class Names {
  private static final int LONGEST = 100;

  private Names() {}

  static String checked(String kind, String name) {
    boolean plain =
        name.equals(name.strip())
            && !name.isEmpty()
            && name.length() <= LONGEST
            && name.codePoints().noneMatch(Character::isISOControl);
    if (!plain) {
      throw new ClaimException(
          "name of a %s: \"%s\": expected 1 to %d visible characters without space at the ends"
              .formatted(kind, pinchoff.source.Excerpt.clip(name, 40), LONGEST));
    }
    return name;
  }
}
