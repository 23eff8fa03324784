package pinchoff.kernel.wire;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.json.JsonException;
import pinchoff.kernel.limits.Limits;

/** Reads connection files strictly: every fault is named with the file, the key and the value. */
public final class ConnectionFile {
  private static final long LARGEST = 65_536;
  private static final Pattern DIGITS = Pattern.compile("[0-9]{1,5}");
  private static final Pattern Z85 =
      Pattern.compile("[0-9a-zA-Z.\\-:+=^!/*?&<>()\\[\\]{}@%$#]{40}");

  private final String name;
  private final Map<String, Object> tree;

  private ConnectionFile(String name, Map<String, Object> tree) {
    this.name = name;
    this.tree = tree;
  }

  /**
   * Reads a file.
   *
   * @throws ConnectionException if it cannot be used, with the reason in one line
   */
  public static ConnectionInfo read(Path file) {
    return new ConnectionFile(file.toString(), tree(file)).info();
  }

  private ConnectionInfo info() {
    checkTransport();
    Map<Channel, Integer> ports = new EnumMap<>(Channel.class);
    for (Channel channel : Channel.values()) {
      int port = port(channel.portKey());
      if (ports.containsValue(port)) {
        throw fault(channel.portKey(), port, "a port of its own");
      }
      ports.put(channel, port);
    }
    return new ConnectionInfo(text("ip"), ports, scheme(), key(), curve());
  }

  private void checkTransport() {
    if (tree.containsKey("registration_port")) {
      throw fault("registration_port", tree.get("registration_port"), "a connection file");
    }
    String transport = tree.containsKey("transport") ? text("transport") : "tcp";
    if (transport.equals("ipc")) {
      throw fault("transport", transport, "\"tcp\": ipc sockets of front ends are not supported");
    }
    if (!transport.equals("tcp")) {
      throw fault("transport", transport, "\"tcp\"");
    }
  }

  private int port(String key) {
    Object value = tree.get(key);
    String digits =
        value instanceof Long n ? n.toString() : value instanceof String s ? s : "no port";
    if (value == null) {
      throw fault(key, "missing", "a port from 1 to 65535");
    }
    int port = DIGITS.matcher(digits).matches() ? Integer.parseInt(digits) : 0;
    if (port < 1 || port > 65_535) {
      throw fault(key, value, "a port from 1 to 65535");
    }
    return port;
  }

  private SignatureScheme scheme() {
    if (!tree.containsKey("signature_scheme")) {
      return SignatureScheme.HMAC_SHA256;
    }
    String label = text("signature_scheme");
    return SignatureScheme.of(label)
        .orElseThrow(() -> fault("signature_scheme", label, "one of " + SignatureScheme.labels()));
  }

  private String key() {
    Object key = tree.get("key");
    if (!(key instanceof String s)) {
      throw fault("key", key == null ? "missing" : "no text", "text, empty for no signatures");
    }
    return s;
  }

  private Optional<CurveKeys> curve() {
    boolean secret = tree.get("curve_secretkey") != null;
    if (!secret && tree.get("curve_publickey") == null) {
      return Optional.empty();
    }
    return Optional.of(new CurveKeys(curveKey("curve_publickey"), curveKey("curve_secretkey")));
  }

  private String curveKey(String key) {
    if (tree.get(key) instanceof String s && Z85.matcher(s).matches()) {
      return s;
    }
    throw fault(key, tree.containsKey(key) ? "no such key" : "missing", "40 characters of Z85");
  }

  private String text(String key) {
    Object value = tree.get(key);
    if (value instanceof String s && !s.isEmpty()) {
      return s;
    }
    throw fault(key, value == null ? "missing" : value, "text");
  }

  private ConnectionException fault(String key, Object value, String expected) {
    String shown = value instanceof String s ? s : Json.text(value);
    return new ConnectionException(
        WireException.printable(
            "connection file \""
                + name
                + "\": \""
                + key
                + "\" is "
                + shown
                + ": expected "
                + expected));
  }

  private static Map<String, Object> tree(Path file) {
    try {
      if (Files.isRegularFile(file) && Files.size(file) > LARGEST) {
        throw unreadable(file, Files.size(file) + " bytes, expected at most " + LARGEST);
      }
      return Json.parseObject(Files.readAllBytes(file), Limits.standard());
    } catch (NoSuchFileException e) {
      throw unreadable(file, "there is no such file");
    } catch (IOException e) {
      throw unreadable(
          file, e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage());
    } catch (JsonException e) {
      throw unreadable(file, e.getMessage());
    }
  }

  private static ConnectionException unreadable(Path file, String reason) {
    return new ConnectionException(
        WireException.printable("connection file \"" + file + "\" cannot be read: " + reason));
  }
}
