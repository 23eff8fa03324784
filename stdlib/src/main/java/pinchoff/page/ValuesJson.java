package pinchoff.page;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Tolerance;

/** Writes a values sheet as the JSON tree of the canonical values, version 1. */
final class ValuesJson {
  private static final int VERSION = 1;

  private ValuesJson() {}

  static Map<String, Object> of(ValuesSheet sheet) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("version", VERSION);
    sheet
        .completeness()
        .ifPresent(c -> tree.put("completeness", Map.of("done", c.done(), "of", c.of())));
    tree.put("premises", sheet.premises().stream().map(ValuesJson::premise).toList());
    tree.put("technologies", sheet.technologies().stream().map(ValuesJson::technology).toList());
    tree.put("values", sheet.values().stream().map(ValuesJson::value).toList());
    return tree;
  }

  private static Map<String, Object> premise(ValuesSheet.Premise premise) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("name", Escape.cleaned(premise.name()));
    putQuantity(tree, premise.value());
    tree.put("overridden", premise.overridden());
    return tree;
  }

  private static Map<String, Object> technology(ValuesSheet.TechnologyFile file) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("name", Escape.cleaned(file.name()));
    tree.put("contentHash", Escape.cleaned(file.contentHash()));
    return tree;
  }

  private static Map<String, Object> value(Value value) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("id", value.id());
    tree.put("name", Escape.cleaned(value.name()));
    tree.put("kind", lowerCase(value.kind()));
    putContent(tree, value.content());
    value.relation().ifPresent(r -> tree.put("relation", Escape.cleaned(r)));
    value.tolerance().ifPresent(t -> tree.put("tolerance", tolerance(t)));
    value.limits().ifPresent(l -> tree.put("limits", limits(l)));
    value.verdict().ifPresent(v -> tree.put("verdict", verdict(v)));
    if (!value.sensitivities().isEmpty()) {
      List<Map<String, Object>> all = new ArrayList<>();
      value.sensitivities().forEach((input, derivative) -> all.add(sensitivity(input, derivative)));
      tree.put("sensitivities", all);
    }
    return tree;
  }

  private static void putContent(Map<String, Object> tree, Value.Content content) {
    if (content instanceof Value.Content.Amount amount) {
      putQuantity(tree, amount.quantity());
    } else if (content instanceof Value.Content.Text text) {
      tree.put("text", Escape.cleaned(text.text()));
    } else if (content instanceof Value.Content.Truth truth) {
      tree.put("holds", truth.holds());
    } else {
      throw new IllegalStateException("a value of an unknown kind: " + content.getClass());
    }
  }

  /** Value in SI, the dimension as its coherent unit, and the unit that people see. */
  private static void putQuantity(Map<String, Object> tree, Quantity quantity) {
    putSi(tree, "value", quantity);
    tree.put("unit", Engineering.of(quantity, Entry.DIGITS).in().ascii());
  }

  private static void putSi(Map<String, Object> tree, String key, Quantity quantity) {
    tree.put(key, SiNumber.of(quantity.si()));
    tree.put("dimension", text(quantity.dimension()));
  }

  private static Map<String, Object> tolerance(Tolerance tolerance) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("absolute", SiNumber.of(tolerance.absolute().si()));
    tree.put("relative", SiNumber.of(tolerance.relative()));
    return tree;
  }

  private static Map<String, Object> limits(Limits limits) {
    Map<String, Object> tree = new LinkedHashMap<>();
    limits.min().ifPresent(q -> tree.put("min", SiNumber.of(q.si())));
    limits.typ().ifPresent(q -> tree.put("typ", SiNumber.of(q.si())));
    limits.max().ifPresent(q -> tree.put("max", SiNumber.of(q.si())));
    return tree;
  }

  private static Map<String, Object> verdict(Verdict verdict) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("standing", lowerCase(verdict.standing()));
    tree.put("words", Escape.cleaned(verdict.words()));
    verdict.margin().ifPresent(m -> putSi(tree, "margin", m));
    return tree;
  }

  private static Map<String, Object> sensitivity(String input, Quantity derivative) {
    Map<String, Object> tree = new LinkedHashMap<>();
    tree.put("input", Escape.cleaned(input));
    putSi(tree, "value", derivative);
    return tree;
  }

  private static String text(Dimension dimension) {
    return dimension.toString();
  }

  private static String lowerCase(Enum<?> constant) {
    return constant.name().toLowerCase(Locale.ROOT);
  }
}
