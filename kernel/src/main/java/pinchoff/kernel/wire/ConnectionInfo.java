package pinchoff.kernel.wire;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * Where the five channels of a kernel are, and how messages on them are signed: the content of a
 * connection file.
 *
 * @param ip address, for example {@code 127.0.0.1}
 * @param ports port of each channel
 * @param scheme how messages are signed
 * @param key the key that signs; empty for none. Never to be logged
 * @param curve the keys that encrypt, if the transport is encrypted
 */
public record ConnectionInfo(
    String ip,
    Map<Channel, Integer> ports,
    SignatureScheme scheme,
    String key,
    Optional<CurveKeys> curve) {

  /** Checks that no port is missing. */
  public ConnectionInfo {
    ports = Map.copyOf(ports);
    for (Channel channel : Channel.values()) {
      if (!ports.containsKey(channel)) {
        throw new IllegalArgumentException("no " + channel.portKey());
      }
    }
  }

  /** The address of a channel. */
  public String endpoint(Channel channel) {
    String host = ip.indexOf(':') >= 0 && !ip.startsWith("[") ? "[" + ip + "]" : ip;
    return "tcp://" + host + ":" + ports.get(channel);
  }

  /** What signs and checks messages with this key. */
  public Signer signer() {
    return new Signer(scheme, key);
  }

  /** The tree of a connection file that says the same. */
  public Map<String, Object> toJson() {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("transport", "tcp");
    tree.put("ip", ip);
    for (Channel channel : Channel.values()) {
      tree.put(channel.portKey(), ports.get(channel));
    }
    tree.put("signature_scheme", scheme.label());
    tree.put("key", key);
    curve.ifPresent(
        c -> {
          tree.put("curve_publickey", c.publicKey());
          tree.put("curve_secretkey", c.secretKey());
        });
    return tree;
  }

  /** Everything but the keys. */
  @Override
  public String toString() {
    return "ConnectionInfo[ip="
        + ip
        + ", ports="
        + ports
        + ", scheme="
        + scheme.label()
        + ", encrypted="
        + curve.isPresent()
        + "]";
  }
}
