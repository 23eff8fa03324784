package pinchoff.kernel.session;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Properties;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.protocol.KernelInfoReply;
import pinchoff.kernel.protocol.Protocol;

/** What this kernel says of itself. */
public final class KernelInfo {
  private static final String VERSION = readVersion();

  private KernelInfo() {}

  /** The version of this program. */
  public static String version() {
    return VERSION;
  }

  static KernelInfoReply reply() {
    return new KernelInfoReply(
        Protocol.VERSION,
        "pinchoff",
        VERSION,
        "Pinchoff " + VERSION + ": MOS hand analysis in Java cells. Hand analysis is not sign-off.",
        Json.object(
            "name",
            "java",
            "version",
            "17",
            "mimetype",
            "text/x-java",
            "file_extension",
            ".java",
            "pygments_lexer",
            "java",
            "codemirror_mode",
            "text/x-java",
            "nbconvert_exporter",
            "script"),
        List.of(),
        List.of());
  }

  private static String readVersion() {
    Properties properties = new Properties();
    try (InputStream in =
        KernelInfo.class.getResourceAsStream("/pinchoff/kernel/version.properties")) {
      if (in == null) {
        throw new IllegalStateException("the resource version.properties is missing");
      }
      properties.load(new InputStreamReader(in, StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return properties.getProperty("version", "unknown");
  }
}
