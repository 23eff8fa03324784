package pinchoff.kernel.json;

import tools.jackson.core.JsonGenerator;
import tools.jackson.core.PrettyPrinter;

/** Lays JSON out with one element a line and one space of indent a level. */
final class OneElementALine implements PrettyPrinter {
  private int level;

  @Override
  public void writeRootValueSeparator(JsonGenerator out) {
    out.writeRaw('\n');
  }

  @Override
  public void writeStartObject(JsonGenerator out) {
    out.writeRaw('{');
    level++;
  }

  @Override
  public void writeEndObject(JsonGenerator out, int count) {
    end(out, count, '}');
  }

  @Override
  public void writeObjectEntrySeparator(JsonGenerator out) {
    out.writeRaw(',');
    newLine(out);
  }

  @Override
  public void writeObjectNameValueSeparator(JsonGenerator out) {
    out.writeRaw(": ");
  }

  @Override
  public void writeStartArray(JsonGenerator out) {
    out.writeRaw('[');
    level++;
  }

  @Override
  public void writeEndArray(JsonGenerator out, int count) {
    end(out, count, ']');
  }

  @Override
  public void writeArrayValueSeparator(JsonGenerator out) {
    out.writeRaw(',');
    newLine(out);
  }

  @Override
  public void beforeArrayValues(JsonGenerator out) {
    newLine(out);
  }

  @Override
  public void beforeObjectEntries(JsonGenerator out) {
    newLine(out);
  }

  private void end(JsonGenerator out, int count, char bracket) {
    level--;
    if (count > 0) {
      newLine(out);
    }
    out.writeRaw(bracket);
  }

  private void newLine(JsonGenerator out) {
    out.writeRaw('\n' + " ".repeat(level));
  }
}
