package pinchoff.kernel.wire;

import java.nio.charset.StandardCharsets;
import java.security.GeneralSecurityException;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import javax.crypto.Mac;
import javax.crypto.spec.SecretKeySpec;

/** Signs the four JSON frames of messages, and checks signatures in constant time. */
public final class Signer {
  private final Optional<Mac> prototype;

  /**
   * Made for one key.
   *
   * @param key the key of the connection file; empty for no signatures at all
   */
  public Signer(SignatureScheme scheme, String key) {
    this(scheme, key.getBytes(StandardCharsets.UTF_8));
  }

  /** Made for one key given as bytes. */
  public Signer(SignatureScheme scheme, byte[] key) {
    prototype = key.length == 0 ? Optional.empty() : Optional.of(mac(scheme, key));
  }

  /** Whether messages are signed. */
  public boolean signs() {
    return prototype.isPresent();
  }

  /** The signature in lower-case hexadecimal digits; empty when there is no key. */
  public byte[] sign(List<byte[]> parts) {
    return prototype
        .map(
            p -> {
              Mac mac = copy(p);
              parts.forEach(mac::update);
              return HexFormat.of().formatHex(mac.doFinal()).getBytes(StandardCharsets.US_ASCII);
            })
        .orElseGet(() -> new byte[0]);
  }

  /** Whether the signature is that of the bytes received. Always true when there is no key. */
  public boolean verifies(byte[] signature, List<byte[]> parts) {
    return !signs() || MessageDigest.isEqual(sign(parts), signature);
  }

  private static Mac mac(SignatureScheme scheme, byte[] key) {
    try {
      Mac mac = Mac.getInstance(scheme.algorithm());
      mac.init(new SecretKeySpec(key, scheme.algorithm()));
      return mac;
    } catch (GeneralSecurityException e) {
      throw new IllegalStateException("this Java platform has no " + scheme.algorithm(), e);
    }
  }

  /**
   * A Mac keeps state: each signature works on its own copy, so that threads may share a signer.
   */
  private static Mac copy(Mac mac) {
    try {
      return (Mac) mac.clone();
    } catch (CloneNotSupportedException e) {
      throw new IllegalStateException("this Java platform cannot copy its HMAC", e);
    }
  }
}
