package pinchoff.device;

/**
 * How a parameter was found, as far as it matters for where it may be used.
 *
 * @param region where the device was measured, for example "saturation", "deep triode" or "weak
 *     inversion"
 * @param method how, in a few words
 */
public record ExtractedFrom(String region, String method) {}
