package pinchoff.kernel.client;

import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;
import java.security.SecureRandom;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.SignatureScheme;

/** Makes connections to kernels that are yet to be started: free ports and a random key. */
final class NewConnection {
  private static final String LOOPBACK = "127.0.0.1";
  private static final int KEY_BYTES = 32;

  private NewConnection() {}

  /** A connection on this machine. The ports were free a moment ago. */
  static ConnectionInfo onThisMachine() throws IOException {
    byte[] key = new byte[KEY_BYTES];
    new SecureRandom().nextBytes(key);
    return new ConnectionInfo(
        LOOPBACK,
        freePorts(),
        SignatureScheme.HMAC_SHA256,
        HexFormat.of().formatHex(key),
        Optional.empty());
  }

  /** Writes a connection file that only this user can read, in a folder of its own. */
  static Path write(ConnectionInfo connection) throws IOException {
    Path folder = Files.createTempDirectory("pinchoff-kernel-");
    Path file = Files.createFile(folder.resolve("connection.json"), privately());
    Files.write(file, Json.bytes(connection.toJson()));
    return file;
  }

  private static FileAttribute<?>[] privately() {
    if (!FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
      return new FileAttribute<?>[0];
    }
    return new FileAttribute<?>[] {
      PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rw-------"))
    };
  }

  private static Map<Channel, Integer> freePorts() throws IOException {
    Map<Channel, Integer> ports = new EnumMap<>(Channel.class);
    List<ServerSocket> held = new ArrayList<>();
    try {
      for (Channel channel : Channel.values()) {
        ServerSocket socket = new ServerSocket(0, 1, InetAddress.getLoopbackAddress());
        held.add(socket);
        ports.put(channel, socket.getLocalPort());
      }
    } finally {
      for (ServerSocket socket : held) {
        socket.close();
      }
    }
    return ports;
  }
}
