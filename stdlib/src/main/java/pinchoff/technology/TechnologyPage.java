package pinchoff.technology;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.device.Polarity;
import pinchoff.page.Column;
import pinchoff.page.Entry;
import pinchoff.page.Page;
import pinchoff.page.Table;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** Shows a technology: one table for each kind of thing, the things side by side. */
final class TechnologyPage {
  /** The most things side by side. */
  private static final int ABREAST = 6;

  private final Technology technology;
  private final Document document;

  TechnologyPage(Technology technology, Document document) {
    this.technology = technology;
    this.document = document;
  }

  Page page() {
    Page.Builder page = Page.titled("Technology {}", technology.name());
    if (!technology.description().isEmpty()) {
      page.prose("{}", technology.description());
    }
    page.table(overview());
    technology.cautions().forEach(caution -> page.caution("{}", caution));
    catalog(page, "Devices", "devices", DeviceFormat.DEVICE);
    corners(page);
    catalog(page, "Rails", "rails", Format.RAIL);
    catalog(page, "Resistors", "passives.resistors", PassiveFormat.RESISTOR);
    catalog(page, "Capacitors", "passives.capacitors", PassiveFormat.CAPACITOR);
    origins(page);
    return page.technology(technology.file(), technology.contentHash()).build();
  }

  private Table.Builder overview() {
    Table.Builder sheet = Table.sheet();
    sheet.line("nominal temperature", technology.nominalTemperature());
    technology
        .temperatureRange()
        .ifPresent(r -> sheet.line("temperature range", r.minimum() + " to " + r.maximum()));
    return sheet.line("file", technology.file()).line("content hash", technology.shortHash());
  }

  private void catalog(Page.Builder page, String heading, String path, Shape.Group each) {
    List<String> names = document.names(path);
    for (int from = 0; from < names.size(); from += ABREAST) {
      List<String> abreast = names.subList(from, Math.min(names.size(), from + ABREAST));
      if (from == 0) {
        page.heading(heading);
      }
      List<Section> sections =
          abreast.stream().map(name -> new Section(document, path + "." + name)).toList();
      page.table(table(abreast, sections, each));
    }
  }

  private Table.Builder table(List<String> names, List<Section> sections, Shape.Group each) {
    List<Column> columns = new ArrayList<>(List.of(Column.of("parameter"), Column.of("")));
    names.forEach(name -> columns.add(Column.of(name)));
    Table.Builder table = Table.of(columns.toArray(Column[]::new));
    rows(table, sections, each, "");
    return table;
  }

  private void rows(Table.Builder table, List<Section> sections, Shape.Group group, String title) {
    List<List<Entry>> rows = new ArrayList<>();
    for (Field field : group.fields()) {
      if (field.shape() instanceof Shape.Leaf) {
        row(field, sections).ifPresent(rows::add);
      }
    }
    if (!rows.isEmpty() && !title.isEmpty()) {
      table.group("{}", title);
    }
    rows.forEach(table::row);
    for (Field field : group.fields()) {
      if (field.shape() instanceof Shape.Group inner) {
        List<Section> within = sections.stream().map(s -> s.in(field.key())).toList();
        rows(
            table,
            within,
            inner,
            title.isEmpty() ? words(field.key()) : title + ", " + field.key());
      }
    }
  }

  /** One parameter of all things; empty if none states it. */
  private Optional<List<Entry>> row(Field field, List<Section> sections) {
    List<Entry> row = new ArrayList<>();
    row.add(Entry.of(words(field.key())));
    row.add(field.symbol().map(Entry::of).orElse(Entry.EMPTY));
    boolean any = false;
    for (Section section : sections) {
      Optional<Stated> stated = document.stated(section.path(field.key()));
      any |= stated.isPresent();
      row.add(stated.map(s -> s.content().entry()).orElse(Entry.EMPTY));
    }
    return any ? Optional.of(row) : Optional.empty();
  }

  /** Corners of the process; those of single devices stand with the devices. */
  private void corners(Page.Builder page) {
    Table.Builder table =
        Table.of(
            Column.of("corner"),
            Column.of("n threshold shift"),
            Column.of("n transconductance"),
            Column.of("p threshold shift"),
            Column.of("p transconductance"));
    Map<Corner, CornerShift> n = technology.corners(Polarity.N);
    Map<Corner, CornerShift> p = technology.corners(Polarity.P);
    if (n.size() == 1 && p.size() == 1) {
      return;
    }
    for (Corner corner : Corner.values()) {
      List<Entry> row = new ArrayList<>(List.of(Entry.of(corner.toString())));
      row.addAll(shift(n.get(corner)));
      row.addAll(shift(p.get(corner)));
      table.row(row);
    }
    page.heading("Corners").table(table.note("A positive shift is slower, for n and p alike."));
  }

  private static List<Entry> shift(@Nullable CornerShift shift) {
    return shift == null
        ? List.of(Entry.EMPTY, Entry.EMPTY)
        : List.of(
            Entry.of(shift.thresholdShift()),
            Entry.of(Quantity.ofSi(shift.transconductanceFactor(), Dimension.NONE)));
  }

  /** Where the values come from, for those that say so. */
  private void origins(Page.Builder page) {
    Table.Builder table =
        Table.of(Column.of("value"), Column.of("region"), Column.of("method"), Column.of("origin"));
    boolean any = false;
    for (Map.Entry<String, Stated> value : document.values().entrySet()) {
      Stated stated = value.getValue();
      if (stated.origin().isPresent()
          || stated.region().isPresent()
          || stated.method().isPresent()) {
        any = true;
        table.row(value.getKey(), stated.region(), stated.method(), stated.origin());
      }
    }
    if (any) {
      page.fold("Where the values come from", details -> details.table(table));
    }
  }

  /** A key in plain words: {@code zeroBiasThreshold} is "zero bias threshold". */
  private static String words(String key) {
    return key.replaceAll("(?<=\\p{Ll})(?=\\p{Lu})", " ").toLowerCase(Locale.ROOT);
  }
}
