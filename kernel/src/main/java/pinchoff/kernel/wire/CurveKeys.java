package pinchoff.kernel.wire;

/**
 * A pair of keys that encrypts the transport, each 40 characters of Z85 text.
 *
 * @param publicKey the key that the other side may know
 * @param secretKey the key that stays in the connection file
 */
public record CurveKeys(String publicKey, String secretKey) {
  /** Says nothing of the keys. */
  @Override
  public String toString() {
    return "CurveKeys";
  }
}
