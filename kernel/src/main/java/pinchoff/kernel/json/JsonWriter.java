package pinchoff.kernel.json;

import java.io.ByteArrayOutputStream;
import java.io.StringWriter;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JsonEncoding;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.PrettyPrinter;
import tools.jackson.core.json.JsonFactory;

/** Writes trees as JSON tokens. */
final class JsonWriter {
  private static final int MAX_DEPTH = 500;
  private static final JsonFactory FACTORY = JsonFactory.builder().build();

  private JsonWriter() {}

  static byte[] compact(@Nullable Object tree) {
    var bytes = new ByteArrayOutputStream(256);
    try (JsonGenerator out =
        FACTORY.createGenerator(ObjectWriteContext.empty(), bytes, JsonEncoding.UTF8)) {
      write(out, tree, 0);
    }
    return bytes.toByteArray();
  }

  static String indented(@Nullable Object tree) {
    var text = new StringWriter();
    try (JsonGenerator out = FACTORY.createGenerator(new Indented(), text)) {
      write(out, tree, 0);
    }
    return text.toString();
  }

  private static void write(JsonGenerator out, @Nullable Object node, int depth) {
    if (depth > MAX_DEPTH) {
      throw new JsonException("a tree deeper than " + MAX_DEPTH + " levels cannot be written");
    }
    if (node instanceof Map<?, ?> map) {
      out.writeStartObject();
      map.forEach(
          (name, value) -> {
            out.writeName(WellFormed.text(String.valueOf(name)));
            write(out, value, depth + 1);
          });
      out.writeEndObject();
    } else if (node instanceof List<?> list) {
      out.writeStartArray();
      for (Object item : list) {
        write(out, item, depth + 1);
      }
      out.writeEndArray();
    } else {
      writeLeaf(out, node);
    }
  }

  private static void writeLeaf(JsonGenerator out, @Nullable Object leaf) {
    if (leaf == null) {
      out.writeNull();
    } else if (leaf instanceof String s) {
      out.writeString(WellFormed.text(s));
    } else if (leaf instanceof Boolean b) {
      out.writeBoolean(b);
    } else if (leaf instanceof Number n) {
      writeNumber(out, n);
    } else {
      throw new JsonException("JSON cannot hold a " + leaf.getClass().getName());
    }
  }

  private static void writeNumber(JsonGenerator out, Number number) {
    if (number instanceof BigInteger b) {
      out.writeNumber(b);
    } else if (number instanceof BigDecimal b) {
      out.writeNumber(b);
    } else if (number instanceof Double || number instanceof Float) {
      if (!Double.isFinite(number.doubleValue())) {
        throw new JsonException("JSON cannot hold the number " + number);
      }
      out.writeNumber(number.doubleValue());
    } else {
      out.writeNumber(number.longValue());
    }
  }

  /** Asks the generator for one element a line. */
  private static final class Indented extends ObjectWriteContext.Base {
    @Override
    public boolean hasPrettyPrinter() {
      return true;
    }

    @Override
    public PrettyPrinter getPrettyPrinter() {
      return new OneElementALine();
    }
  }
}
