package lodebook.db.layouts;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LAYOUT_RELEASE;
import static lodebook.db.tables.Tables.LAYOUT_REVISION;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.PERSON;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spread;
import lodebook.db.tables.tables.MagnetType;
import lodebook.db.tables.tables.records.LayoutReleaseRecord;
import lodebook.db.tables.tables.records.LayoutRevisionRecord;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;

/// Layout revisions as rows.
final class LayoutRows {
  private static final MagnetType SIDE = MAGNET_TYPE.as("side_type");

  private LayoutRows() {}

  /// Revisions that meet a condition on LAYOUT_REVISION, CODE or LAYOUT_RELEASE; by the layout's
  /// code and in the order in which they were first imported.
  static List<LayoutRevision> fetch(DSLContext sql, Condition condition) {
    return sql.select()
        .from(LAYOUT_REVISION)
        .join(CODE)
        .on(CODE.ID.eq(LAYOUT_REVISION.LAYOUT_ID))
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LAYOUT_REVISION.TYPE_ID))
        .join(SIDE)
        .on(SIDE.ID.eq(LAYOUT_REVISION.SIDE_TYPE_ID))
        .leftJoin(LAYOUT_RELEASE)
        .on(LAYOUT_RELEASE.ID.eq(LAYOUT_REVISION.ID))
        .leftJoin(PERSON)
        .on(PERSON.ID.eq(LAYOUT_RELEASE.RELEASED_BY))
        .where(condition)
        .orderBy(LAYOUT_REVISION.ID)
        .fetch(LayoutRows::revision);
  }

  private static LayoutRevision revision(Record found) {
    LayoutRevisionRecord row = found.into(LAYOUT_REVISION);
    LayoutReleaseRecord release = found.into(LAYOUT_RELEASE);
    Released released =
        found.get(LAYOUT_RELEASE.ID) == null
            ? null
            : new Released(found.get(PERSON.INITIALS), release.getReleasedAt());
    return new LayoutRevision(
        row.getId(),
        layout(row, found.get(CODE.SHOWN), found.get(MAGNET_TYPE.NAME), found.get(SIDE.NAME)),
        row.getRecordedAt(),
        released);
  }

  private static Layout layout(
      LayoutRevisionRecord row, String code, String type, String sideType) {
    return new Layout(
        code,
        row.getRevision(),
        Math.toIntExact(row.getPolePairs()),
        Math.toIntExact(row.getSegmentsPerPolePair()),
        Focus.valueOf(upper(row.getFocus())),
        Numbering.valueOf(upper(row.getNumbering())),
        row.getFirstSlotClockDegrees(),
        new Facing(row.getFirstFacingDegrees()),
        row.getSlotRadiusMetres(),
        type,
        row.getSideTypeId().equals(row.getTypeId()) ? null : sideType,
        row.getWorkingRadiusMetres(),
        new Probe(
            row.getProbeRadiusMetres(),
            row.getProbeHeightMetres(),
            Arrays.stream(row.getProbeSpots().split(",")).map(LayoutWords::spot).toList(),
            Arrays.stream(row.getProbeComponents().split(","))
                .map(LayoutWords::component)
                .toList()),
        new Spread(
            row.getPocketMetres(),
            row.getFacingDegrees(),
            row.getProbeMetres(),
            row.getProbeTiltDegrees()),
        row.getAdhesive(),
        row.getAdhesiveMinutes() == 0 ? null : row.getAdhesiveMinutes(),
        row.getBodyTurns(),
        InsertFrom.valueOf(upper(row.getInsertFrom())),
        row.getAmplitudeToleranceRelative());
  }

  /// Fills a row with what a layout says.
  static void fill(LayoutRevisionRecord row, Layout layout, long typeId, long sideTypeId) {
    row.setRevision(layout.revision());
    row.setPolePairs((long) layout.polePairs());
    row.setSegmentsPerPolePair((long) layout.segmentsPerPolePair());
    row.setFocus(lower(layout.focus()));
    row.setNumbering(lower(layout.numbering()));
    row.setFirstSlotClockDegrees(layout.firstSlotClockDegrees());
    row.setFirstFacingDegrees(layout.firstFacing().degrees());
    row.setSlotRadiusMetres(layout.slotRadiusMetres());
    row.setTypeId(typeId);
    row.setSideTypeId(sideTypeId);
    row.setWorkingRadiusMetres(layout.workingRadiusMetres());
    row.setProbeRadiusMetres(layout.probe().radiusMetres());
    row.setProbeHeightMetres(layout.probe().heightMetres());
    row.setProbeSpots(
        layout.probe().spots().stream().map(LayoutWords::word).collect(Collectors.joining(",")));
    row.setProbeComponents(
        layout.probe().components().stream()
            .map(LayoutWords::word)
            .collect(Collectors.joining(",")));
    row.setPocketMetres(layout.spread().pocketMetres());
    row.setFacingDegrees(layout.spread().facingDegrees());
    row.setProbeMetres(layout.spread().probeMetres());
    row.setProbeTiltDegrees(layout.spread().probeTiltDegrees());
    row.setAdhesive(layout.adhesive());
    Double minutes = layout.adhesiveWorkingMinutes();
    row.setAdhesiveMinutes(minutes == null ? 0 : minutes);
    row.setBodyTurns(layout.bodyTurns());
    row.setInsertFrom(lower(layout.insertFrom()));
    row.setAmplitudeToleranceRelative(layout.workingAmplitudeTolerance());
  }

  private static String lower(Enum<?> word) {
    return word.name().toLowerCase(Locale.ROOT);
  }

  private static String upper(String word) {
    return word.toUpperCase(Locale.ROOT);
  }
}
