package pinchoff.technology;

import java.nio.file.Path;
import java.util.Collection;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.device.Device;
import pinchoff.device.Polarity;
import pinchoff.device.Source;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;
import pinchoff.source.Excerpt;
import pinchoff.source.SourceText;
import pinchoff.source.Suggestions;

/**
 * A process: its devices with all their parameter sets, rails, corners, resistors and capacitors,
 * as a technology file states them.
 *
 * <p>A technology file is JSON in UTF-8 whose name ends in {@code .tech.json}. Each value has its
 * unit: {@code "bodyFactor": "0.44 V^0.5"}. Where it matters, a value says where it comes from:
 * {@code "zeroBiasThreshold": {"value": "0.45 V", "extractedFrom": {"region": "saturation",
 * "method": "…"}, "origin": "…"}}. {@link #schema()} has all keys with their meaning.
 *
 * <p>Signs: a threshold is signed as V_GS is, so it is negative for a p device that is off at V_GS
 * = 0, and {@code mode} says {@code enhancement} or {@code depletion} so that a wrong sign is
 * found. All other parameters are positive for n and p alike.
 *
 * <p>Two technologies are equal if they state the same, however it is laid out, ordered and spelled
 * in units. Immutable.
 */
public final class Technology implements Displayable {
  private static final int SHORT_HASH = 12;

  private final String file;
  private final Document document;
  private final String hash;
  private final Temperature nominalTemperature;
  private final Map<String, Rail> rails;
  private final Map<String, Device> devices;
  private final Map<String, Map<Corner, CornerShift>> corners;
  private final Passives passives;
  private final Optional<TemperatureRange> temperatureRange;

  private Technology(String file, Document document) {
    this.file = file;
    this.document = document;
    this.hash = document.hash();
    Parts parts = new Parts(document);
    this.nominalTemperature = parts.nominalTemperature();
    this.rails = Collections.unmodifiableMap(parts.rails());
    this.devices = Collections.unmodifiableMap(parts.devices(Source.of(file, hash)));
    this.corners = parts.deviceCorners();
    this.passives = parts.passives();
    this.temperatureRange = parts.temperatureRange();
  }

  /**
   * Reads a technology file.
   *
   * @param path the file, relative to the working directory
   * @throws TechnologyException if it cannot be read, with the path; or with every fault in it,
   *     each with line, column and what was expected
   */
  public static Technology read(String path) {
    return read(FileText.path(path));
  }

  /**
   * Reads a technology file.
   *
   * @param path the file, relative to the working directory
   * @throws TechnologyException if it cannot be read, with the path; or with every fault in it,
   *     each with line, column and what was expected
   */
  public static Technology read(Path path) {
    SourceText source = FileText.read(path);
    Technology technology = parse(source, FileText.name(path));
    Host.current().noteTechnology(source.name(), technology.hash);
    return technology;
  }

  /**
   * Reads the text of a technology file.
   *
   * @param text JSON
   * @param name what the text is known by in messages, and as the source of its devices
   * @throws TechnologyException with every fault in it, each with line, column and what was
   *     expected
   */
  public static Technology parse(String text, String name) {
    return parse(SourceText.of(name, text), name);
  }

  private static Technology parse(SourceText source, String file) {
    Faults faults = new Faults(source);
    Optional<JsonNode> root = JsonText.parse(faults);
    if (root.isEmpty()) {
      throw faults.exception();
    }
    Document document = DocumentReader.read(root.get(), faults);
    Rules.check(document, faults);
    faults.throwAny();
    try {
      return new Technology(file, document);
    } catch (IllegalArgumentException refused) {
      throw new TechnologyException(source.name() + ": " + refused.getMessage());
    }
  }

  /** The JSON Schema (2020-12) of technology files, for editors that check while one writes. */
  public static String schema() {
    return SchemaText.of();
  }

  /** The name of the process. */
  public String name() {
    return document.words("name").orElse("");
  }

  /** What the file says of itself; may be empty. */
  public String description() {
    return document.words("description").orElse("");
  }

  /** The name of the file, or what the text was called. */
  public String file() {
    return file;
  }

  /** The temperature that all values hold at. */
  public Temperature nominalTemperature() {
    return nominalTemperature;
  }

  /** The temperatures that the process is made for, if it says so. */
  public Optional<TemperatureRange> temperatureRange() {
    return temperatureRange;
  }

  /** The supply rails, in the order of the file. */
  public Collection<Rail> rails() {
    return rails.values();
  }

  /**
   * A supply rail.
   *
   * @throws TechnologyException if there is none of this name, with those that there are
   */
  public Rail rail(String name) {
    return find("rail", rails, name);
  }

  /** The devices, in the order of the file. */
  public Collection<Device> devices() {
    return devices.values();
  }

  /**
   * A device with its typical parameters.
   *
   * @throws TechnologyException if there is none of this name, with those that there are
   */
  public Device device(String name) {
    return find("device", devices, name);
  }

  /**
   * A device in a process corner.
   *
   * @throws TechnologyException if there is no such device, or the technology states no such corner
   *     for it
   */
  public Device device(String name, Corner corner) {
    Device device = device(name);
    return Device.of(
        corner(name, corner).applyTo(device.parameters()),
        device.rules(),
        device.ratings(),
        device.source());
  }

  /**
   * How a device differs from its typical parameters in a corner: as the file says of the device
   * itself, else of all devices of its polarity.
   *
   * @throws TechnologyException if there is no such device, or the technology states no such corner
   *     for it
   */
  public CornerShift corner(String device, Corner corner) {
    CornerShift shift = find("device", corners, device).get(corner);
    if (shift == null) {
      throw new TechnologyException(file + " states no " + corner + " corner for device " + device);
    }
    return shift;
  }

  /**
   * The corners that the technology states for all devices of a polarity; {@link Corner#TYPICAL} is
   * always among them.
   */
  public Map<Corner, CornerShift> corners(Polarity polarity) {
    return Collections.unmodifiableMap(new Parts(document).corners(polarity));
  }

  /** The resistors and capacitors. */
  public Passives passives() {
    return passives;
  }

  /**
   * A kind of resistor.
   *
   * @throws TechnologyException if there is none of this name, with those that there are
   */
  public ResistorKind resistor(String name) {
    return find("resistor", passives.resistors(), name);
  }

  /**
   * A kind of capacitor.
   *
   * @throws TechnologyException if there is none of this name, with those that there are
   */
  public CapacitorKind capacitor(String name) {
    return find("capacitor", passives.capacitors(), name);
  }

  /**
   * SHA-256 of what the file states, in hexadecimal. It does not depend on layout, the order of
   * keys or the spelling of units, and changes with anything else, be it only an origin.
   */
  public String contentHash() {
    return hash;
  }

  /** The first {@value #SHORT_HASH} digits of the content hash, enough to tell files apart. */
  public String shortHash() {
    return hash.substring(0, SHORT_HASH);
  }

  /**
   * What a reader should know before trusting the numbers: parameters that do not agree with what
   * the layers make of them, thresholds and k' that do not say how they were found, rails above
   * ratings.
   */
  public List<String> cautions() {
    return Cautions.of(document, nominalTemperature);
  }

  /**
   * This technology with another value, checked as if it stood in the file.
   *
   * @param path where it stands, for example {@code devices.core-n.squareLaw.zeroBiasThreshold}
   * @param value what to put there
   * @param origin where it comes from, for example how it was extracted
   * @throws TechnologyException if there is no such path, or the value cannot stand there
   */
  public Technology with(String path, Quantity value, String origin) {
    Stated stated =
        new Stated(
            new Stated.Content.Amount(value),
            value.asciiText(),
            Optional.of(origin),
            Optional.empty(),
            Optional.empty(),
            Place.NONE);
    Technology changed = parse(DocumentText.of(document.with(path, stated)), file);
    if (changed.document.amount(path).isEmpty()) {
      throw new TechnologyException(
          "technology "
              + name()
              + " has no value "
              + Excerpt.quote(path)
              + Suggestions.didYouMean(path, document.values().keySet())
                  .map(hint -> "; " + hint)
                  .orElse(""));
    }
    return changed;
  }

  /**
   * Compares this technology with another.
   *
   * @return each value that differs: parameter, this, the other, change in percent
   */
  public Comparison compare(Technology other) {
    return new Comparison(title(), other.title(), Differences.between(document, other.document));
  }

  private String title() {
    return name() + " " + shortHash();
  }

  /** The text of the technology as a file: the same technology always gives the same text. */
  public String text() {
    return DocumentText.of(document);
  }

  /**
   * Writes the technology to a file, which is replaced as a whole or not at all.
   *
   * @param path the file, relative to the working directory
   * @throws TechnologyException if it cannot be written, with the path
   */
  public void write(String path) {
    write(FileText.path(path));
  }

  /**
   * Writes the technology to a file, which is replaced as a whole or not at all.
   *
   * @param path the file, relative to the working directory
   * @throws TechnologyException if it cannot be written, with the path
   */
  public void write(Path path) {
    FileWriter.write(path, text());
  }

  /** All that is stated, as tables. */
  public Page page() {
    return new TechnologyPage(this, document).page();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }

  private <T> T find(String what, Map<String, T> known, String name) {
    T found = known.get(name);
    if (found != null) {
      return found;
    }
    String hint =
        Suggestions.didYouMean(name, known.keySet())
            .orElse(
                known.isEmpty() ? "it has none" : "expected " + String.join(", ", known.keySet()));
    throw new TechnologyException(
        "technology " + name() + " has no " + what + " " + Excerpt.quote(name) + ": " + hint);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Technology t && document.canonical().equals(t.document.canonical());
  }

  @Override
  public int hashCode() {
    return hash.hashCode();
  }

  /** Name and short hash. */
  @Override
  public String toString() {
    return "technology " + title();
  }
}
