package eddyledger.present;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.OperatingCondition;
import java.util.ArrayList;
import java.util.List;

/**
 * Puts the texts of the sheet together.
 *
 * @param context what the fields are read from
 * @param findings what was found about the vehicle
 * @param stay what is being typed
 */
record SheetTexts(SheetContext context, List<Finding> findings, SheetStay stay) {
  SheetText text() {
    List<SheetText.Group> groups = new ArrayList<>();
    for (SheetEntries.Group group : SheetEntries.of(context)) {
      List<SheetField> fields = group.entries().stream().map(this::field).toList();
      groups.add(
          new SheetText.Group(group.key(), group.heading(), group.note(), group.grid(), fields));
    }
    String row = context.row();
    return new SheetText(
        row,
        SheetRow.name(context.vehicle(), row),
        SheetRow.trail(context.vehicle(), row),
        messages(),
        groups,
        context.trace().isPresent());
  }

  private SheetField field(Entry entry) {
    SheetField plain = entry.show(context);
    FieldBuilder field = FieldBuilder.of(plain);
    List<String> places = plain.editable() ? entry.places(context) : List.of();
    String condition = context.selection().conditionId();
    findings.stream()
        .filter(finding -> finding.severity().atLeast(Severity.WARNING))
        .filter(finding -> FindingPlaces.meets(finding, places, condition))
        .filter(this::ofThisCondition)
        .forEach(finding -> field.message(FindingPlaces.message(finding)));
    stay.typed(entry.key()).ifPresent(field::text);
    stay.refusal(entry.key()).ifPresent(words -> field.message(SheetMessage.error(words)));
    return field.build();
  }

  private List<SheetMessage> messages() {
    String place = FindingPlaces.ofRow(context.vehicle(), context.row());
    return findings.stream()
        .filter(finding -> !place.isEmpty() && finding.place().equals(place))
        .filter(finding -> finding.severity().atLeast(Severity.WARNING))
        .filter(this::ofThisCondition)
        .map(finding -> FindingPlaces.message(finding))
        .toList();
  }

  /** What is said of one condition is said in that condition only. */
  private boolean ofThisCondition(Finding finding) {
    String what = finding.what();
    return context.vehicle().conditions().stream()
        .map(OperatingCondition::id)
        .filter(id -> !id.equals(context.selection().conditionId()))
        .noneMatch(id -> what.contains("n condition \"" + id + "\""));
  }
}
