package pinchoff.kernel.protocol;

import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * What this kernel is.
 *
 * @param protocolVersion version of the protocol
 * @param implementation name of the kernel
 * @param implementationVersion its version
 * @param banner text for a console
 * @param languageInfo name, version, mimetype, file_extension and more of the language
 * @param helpLinks entries of a help menu
 * @param supportedFeatures optional parts of the protocol
 */
public record KernelInfoReply(
    String protocolVersion,
    String implementation,
    String implementationVersion,
    String banner,
    Map<String, Object> languageInfo,
    List<Object> helpLinks,
    List<String> supportedFeatures)
    implements Content {
  /** The message type. */
  public static final String TYPE = "kernel_info_reply";

  static KernelInfoReply read(Fields in) {
    return new KernelInfoReply(
        in.string("protocol_version", ""),
        in.string("implementation", ""),
        in.string("implementation_version", ""),
        in.string("banner", ""),
        in.object("language_info"),
        in.list("help_links"),
        in.strings("supported_features"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "status",
        "ok",
        "protocol_version",
        protocolVersion,
        "implementation",
        implementation,
        "implementation_version",
        implementationVersion,
        "banner",
        banner,
        "language_info",
        languageInfo,
        "help_links",
        helpLinks,
        "supported_features",
        supportedFeatures);
  }
}
