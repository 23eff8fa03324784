package pinchoff.kernel.wire;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/** How messages are signed. */
public enum SignatureScheme {
  /** The usual one. */
  HMAC_SHA256("HmacSHA256"),
  /** A longer one. */
  HMAC_SHA512("HmacSHA512"),
  /** An old one that the connection file may still name. */
  HMAC_MD5("HmacMD5");

  private final String algorithm;

  SignatureScheme(String algorithm) {
    this.algorithm = algorithm;
  }

  /** The name of the algorithm in the Java platform. */
  public String algorithm() {
    return algorithm;
  }

  /** The name in a connection file, for example {@code hmac-sha256}. */
  public String label() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** The scheme of a name in a connection file, if it is known. */
  public static Optional<SignatureScheme> of(String label) {
    return Arrays.stream(values()).filter(s -> s.label().equals(label)).findFirst();
  }

  /** All known names, for messages. */
  static String labels() {
    return Arrays.stream(values()).map(SignatureScheme::label).collect(Collectors.joining(", "));
  }
}
