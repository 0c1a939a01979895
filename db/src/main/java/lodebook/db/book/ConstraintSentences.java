package lodebook.db.book;

import java.sql.SQLException;
import java.util.Map;
import java.util.Objects;
import lodebook.db.refusal.Refusal;
import org.jooq.exception.DataAccessException;

/// Turns a rule that the database refused into the sentence for it.
///
/// Operations look before they write and name the thing; this speaks where two of them met.
final class ConstraintSentences {
  /// Constraints that a person can run into, and the key of the sentence for each.
  private static final Map<String, String> KEYS =
      Map.ofEntries(
          Map.entry("uq_code_folded", "rule.code-taken"),
          Map.entry("uq_person_initials", "rule.initials-taken"),
          Map.entry("uq_grade_name", "rule.grade-taken"),
          Map.entry("uq_magnet_type_name", "rule.type-taken"),
          Map.entry("uq_piece_number", "rule.piece-taken"),
          Map.entry("uq_piece_reading_once", "rule.reading-again"),
          Map.entry("ck_piece_reading_north", "rule.reading-negative"),
          Map.entry("pk_cell_content", "rule.cell-taken"),
          Map.entry("uq_cell_content_piece", "rule.piece-in-two-cells"),
          Map.entry("ck_lot_count", "rule.lot-used-up"),
          Map.entry("fk_live_slot_lot_clear", "rule.lot-not-clear"),
          Map.entry("ck_live_slot_lot_clear", "rule.lot-not-clear"),
          Map.entry("fk_live_placement_piece_clear", "rule.piece-not-clear"),
          Map.entry("ck_live_placement_piece_clear", "rule.piece-not-clear"),
          Map.entry("pk_live_placement", "rule.piece-placed"),
          Map.entry("pk_live_slot", "rule.slot-filled"),
          Map.entry("pk_placement_end", "rule.placement-superseded"),
          Map.entry("pk_reserved_piece", "rule.piece-reserved"),
          Map.entry("uq_layout_revision_name", "rule.layout-revision-taken"),
          Map.entry("fk_layout_release_all", "rule.layout-released"),
          Map.entry("pk_layout_release", "rule.layout-released"),
          Map.entry("uq_gear_revision_name", "rule.gear-revision-taken"),
          Map.entry("fk_gear_release_all", "rule.gear-released"),
          Map.entry("pk_gear_release", "rule.gear-released"),
          Map.entry("fk_gear_release_inner", "rule.gear-pins-drafts"),
          Map.entry("fk_gear_release_outer", "rule.gear-pins-drafts"),
          Map.entry("fk_rotor_layout", "rule.layout-not-released"),
          Map.entry("fk_batch_gear", "rule.gear-not-released"),
          Map.entry("fk_unit_gear", "rule.gear-not-released"),
          Map.entry("pk_live_rotor", "rule.rotor-in-unit"),
          Map.entry("uq_live_rotor_position", "rule.unit-has-rotor"));

  private ConstraintSentences() {}

  /// The refusal for a failed statement; a failure that is no rule of the shop comes back as it is.
  static RuntimeException explain(DataAccessException failure) {
    SQLException cause = failure.getCause(SQLException.class);
    if (cause == null) {
      return failure;
    }
    String state = String.valueOf(cause.getSQLState());
    if (state.equals("55P03") || state.equals("HYT00") || state.equals("40P01")) {
      return Refusal.cannotOpen("book.locked").because(failure);
    }
    if (!state.startsWith("23")) {
      return failure;
    }
    return ConstraintNames.in(String.valueOf(cause.getMessage()))
        .map(KEYS::get)
        .filter(Objects::nonNull)
        .findFirst()
        .<RuntimeException>map(key -> Refusal.refused(key).because(failure))
        .orElse(failure);
  }
}
