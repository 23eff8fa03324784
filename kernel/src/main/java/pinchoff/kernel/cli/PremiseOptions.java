package pinchoff.kernel.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/** The options that set premises. */
final class PremiseOptions {
  @Option(
      names = "--premise",
      paramLabel = "NAME=VALUE",
      description = "Set a premise of the notebook, for example V_DD=1.62V; may be repeated.")
  private List<String> premises = new ArrayList<>();

  @Option(
      names = "--premises",
      paramLabel = "FILE",
      description = "Set the premises in a file, one NAME=VALUE to a line.")
  private @Nullable String file;

  Map<String, String> all() {
    Map<String, String> all = new LinkedHashMap<>();
    if (file != null) {
      all.putAll(PremiseFile.read(Paths.of(file)));
    }
    premises.forEach(text -> PremiseFile.add(all, text, "--premise"));
    return all;
  }
}
