package pinchoff.kernel.notebook;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.JsonException;

/** Builds a notebook from the JSON tree of its file. */
final class NotebookReader {
  private final int minor;

  private NotebookReader(int minor) {
    this.minor = minor;
  }

  /**
   * Reads a notebook.
   *
   * @throws JsonException if the tree is no notebook of format 4, with the place
   */
  static Notebook read(@Nullable Object tree) {
    Map<String, Object> top = Fields.object(tree, "the notebook");
    if (!top.containsKey("nbformat")
        || (!top.containsKey("cells") && !top.containsKey("worksheets"))) {
      throw new JsonException("this is JSON but no notebook: it has no \"nbformat\" and \"cells\"");
    }
    Fields fields = Fields.of(top, "the notebook");
    int major = fields.integer("nbformat");
    if (major != 4) {
      throw new JsonException(
          "this is a notebook of format "
              + major
              + ": expected format 4; a notebook front end can raise an older one");
    }
    int minor = fields.integer("nbformat_minor", 0);
    if (minor < 0) {
      throw new JsonException(
          "the notebook: field \"nbformat_minor\" is " + minor + ": expected 0 or more");
    }
    return new Notebook(
        Math.max(minor, Notebook.MINOR),
        Trees.without(fields.object("metadata"), "orig_nbformat", "signature"),
        new NotebookReader(minor).cells(fields.list("cells")),
        minor > Notebook.MINOR
            ? Trees.without(top, "nbformat", "nbformat_minor", "metadata", "cells")
            : Map.of());
  }

  private List<NotebookCell> cells(List<Object> trees) {
    List<Map<String, Object>> fields = new ArrayList<>();
    List<Optional<String>> ids = new ArrayList<>();
    for (Object tree : trees) {
      Map<String, Object> cell = Fields.object(tree, place(fields.size()));
      fields.add(cell);
      ids.add(cell.get("id") instanceof String id ? Optional.of(id) : Optional.empty());
    }
    CellIds cellIds = new CellIds(ids);
    List<NotebookCell> cells = new ArrayList<>();
    for (int i = 0; i < fields.size(); i++) {
      Map<String, Object> cell = fields.get(i);
      String text = MultilineText.join(cell.get("source")).orElse("");
      cells.add(cell(cell, cellIds.next(ids.get(i), i, text), place(i)));
    }
    return cells;
  }

  private static String place(int index) {
    return "cell " + (index + 1);
  }

  private NotebookCell cell(Map<String, Object> tree, String id, String where) {
    Fields fields = Fields.of(tree, where);
    String type = fields.string("cell_type");
    return switch (type) {
      case "code" ->
          new CodeCell(
              id,
              cellMetadata(fields),
              text(tree, "source", where),
              outputs(fields.list("outputs"), where),
              count(tree, where),
              others(tree, "outputs", "execution_count"));
      case "markdown" -> textCell(TextCell.Kind.MARKDOWN, tree, fields, id, where);
      case "raw" -> textCell(TextCell.Kind.RAW, tree, fields, id, where);
      default -> {
        if (minor <= Notebook.MINOR) {
          throw new JsonException(
              where + ": cell type \"" + type + "\": expected code, markdown or raw");
        }
        yield new UnknownCell(id, Trees.without(tree, "id"));
      }
    };
  }

  private TextCell textCell(
      TextCell.Kind kind, Map<String, Object> tree, Fields fields, String id, String where) {
    Map<String, Object> others = others(tree, "attachments");
    if (fields.has("attachments")) {
      others = Trees.with(others, "attachments", fields.object("attachments"));
    }
    return new TextCell(id, kind, cellMetadata(fields), text(tree, "source", where), others);
  }

  /** A mark of trust is a front end's own affair and does not belong in a file. */
  private static Map<String, Object> cellMetadata(Fields fields) {
    return Trees.without(fields.object("metadata"), "trusted");
  }

  /** Fields beside the known ones, of which only a later minor version may have any. */
  private Map<String, Object> others(Map<String, Object> tree, String... known) {
    return minor > Notebook.MINOR
        ? Trees.without(Trees.without(tree, "id", "cell_type", "metadata", "source"), known)
        : Map.of();
  }

  private List<Output> outputs(List<Object> trees, String where) {
    List<Output> outputs = new ArrayList<>();
    for (Object tree : trees) {
      String place = where + ", output " + (outputs.size() + 1);
      outputs.add(output(Fields.object(tree, place), place));
    }
    return outputs;
  }

  private Output output(Map<String, Object> tree, String where) {
    Fields fields = Fields.of(tree, where);
    String type = fields.string("output_type");
    return switch (type) {
      case "stream" ->
          new Output.StreamText(fields.string("name", "stdout"), text(tree, "text", where));
      case "display_data" ->
          new Output.Display(bundle(fields.object("data")), fields.object("metadata"));
      case "execute_result" ->
          new Output.Result(
              count(tree, where), bundle(fields.object("data")), fields.object("metadata"));
      case "error" ->
          new Output.Failure(
              fields.string("ename"), fields.string("evalue", ""), fields.strings("traceback"));
      default -> {
        if (minor <= Notebook.MINOR) {
          throw new JsonException(
              where
                  + ": output type \""
                  + type
                  + "\": expected stream, display_data, execute_result or error");
        }
        yield new Output.Unknown(tree);
      }
    };
  }

  private static Map<String, Object> bundle(Map<String, Object> data) {
    Map<String, Object> joined = new LinkedHashMap<>(data);
    joined.replaceAll(
        (type, value) ->
            MimeTypes.isJson(type)
                ? value
                : MultilineText.join(value).<Object>map(text -> text).orElse(value));
    return joined;
  }

  private static String text(Map<String, Object> tree, String name, String where) {
    return MultilineText.join(tree.get(name))
        .orElseThrow(
            () ->
                new JsonException(
                    where
                        + ": field \""
                        + name
                        + "\" is "
                        + (tree.get(name) == null ? "missing" : "no text")
                        + ": expected a string or a list of strings"));
  }

  /** A count may have become a decimal number on its way through some program. */
  private static Optional<Integer> count(Map<String, Object> tree, String where) {
    Object value = tree.get("execution_count");
    if (value == null) {
      return Optional.empty();
    }
    if (value instanceof Number n
        && n.doubleValue() == Math.rint(n.doubleValue())
        && n.doubleValue() >= 0
        && n.doubleValue() <= Integer.MAX_VALUE) {
      return Optional.of(n.intValue());
    }
    throw new JsonException(
        where
            + ": field \"execution_count\" is "
            + (value instanceof Number ? value : "no number")
            + ": expected a whole number from 0 to "
            + Integer.MAX_VALUE
            + ", or null");
  }
}
