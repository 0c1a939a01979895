package lodebook.db.builds;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// The lots and pieces that a placing speaks of, as they are when it begins.
final class BenchStock {
  private final Map<String, Code> codes;
  private final Map<Long, Lot> lots = new HashMap<>();
  private final Map<Long, Map<Long, Piece>> pieces = new HashMap<>();

  /// A lot of magnets.
  ///
  /// @param clear whether its magnets may be placed
  /// @param free how many are neither placed nor scrapped
  record Lot(long id, String code, String type, String state, boolean clear, long free) {}

  /// A measured piece.
  ///
  /// @param state `usable`, `held` or `scrapped`
  /// @param standsIn where it stands, or null
  /// @param keptForId the rotor whose plan keeps it, or null
  /// @param keptFor that rotor's number, or null
  record Piece(
      long id,
      String state,
      @Nullable Stand standsIn,
      @Nullable Long keptForId,
      @Nullable String keptFor) {}

  /// Where a piece stands.
  record Stand(long placementId, long rotorId, String rotor, int slot) {}

  /// Loads what the names speak of.
  BenchStock(DSLContext sql, Collection<MagnetName> names) {
    codes = Codes.findAll(sql, names.stream().map(MagnetName::lot).toList());
    List<Long> ids =
        codes.values().stream().filter(code -> code.kind() == CodeKind.LOT).map(Code::id).toList();
    sql.select()
        .from(LOT)
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LOT.TYPE_ID))
        .where(LOT.ID.in(ids))
        .forEach(
            row ->
                lots.put(
                    row.get(LOT.ID),
                    new Lot(
                        row.get(LOT.ID),
                        row.get(CODE.SHOWN),
                        row.get(MAGNET_TYPE.NAME),
                        row.get(LOT.STATE),
                        row.get(LOT.CLEAR),
                        row.get(LOT.PIECE_COUNT)
                            - row.get(LOT.PLACED_COUNT)
                            - row.get(LOT.SCRAPPED_COUNT))));
    for (Lot lot : lots.values()) {
      Set<Long> numbers = new LinkedHashSet<>();
      for (MagnetName name : names) {
        if (name.number() != null && CodeText.fold(name.lot()).equals(CodeText.fold(lot.code()))) {
          numbers.add(name.number());
        }
      }
      pieces.put(lot.id(), load(sql, lot.id(), numbers));
    }
  }

  private static Map<Long, Piece> load(DSLContext sql, long lotId, Set<Long> numbers) {
    Map<Long, Piece> found = new HashMap<>();
    if (numbers.isEmpty()) {
      return found;
    }
    lodebook.db.tables.tables.Code standing = CODE.as("standing_code");
    lodebook.db.tables.tables.Code keeping = CODE.as("keeping_code");
    sql.select()
        .from(PIECE)
        .leftJoin(LIVE_PLACEMENT)
        .on(LIVE_PLACEMENT.PIECE_ID.eq(PIECE.ID))
        .leftJoin(PLACEMENT)
        .on(PLACEMENT.ID.eq(LIVE_PLACEMENT.PLACEMENT_ID))
        .leftJoin(standing)
        .on(standing.ID.eq(PLACEMENT.ROTOR_ID))
        .leftJoin(RESERVED_PIECE)
        .on(RESERVED_PIECE.PIECE_ID.eq(PIECE.ID))
        .leftJoin(LIVE_PLAN)
        .on(LIVE_PLAN.PLAN_ID.eq(RESERVED_PIECE.PLAN_ID))
        .leftJoin(keeping)
        .on(keeping.ID.eq(LIVE_PLAN.ROTOR_ID))
        .where(PIECE.LOT_ID.eq(lotId).and(PIECE.NUMBER.in(numbers)))
        .forEach(
            row ->
                found.put(
                    row.get(PIECE.NUMBER),
                    new Piece(
                        row.get(PIECE.ID),
                        row.get(PIECE.STATE),
                        row.get(PLACEMENT.ID) == null
                            ? null
                            : new Stand(
                                row.get(PLACEMENT.ID),
                                row.get(PLACEMENT.ROTOR_ID),
                                row.get(standing.SHOWN),
                                Math.toIntExact(row.get(PLACEMENT.SLOT))),
                        row.get(LIVE_PLAN.ROTOR_ID),
                        row.get(keeping.SHOWN))));
    return found;
  }

  /// What the number of a name's lot is in the book, or null.
  @Nullable Code code(MagnetName name) {
    return codes.get(CodeText.fold(name.lot()));
  }

  /// The lot of a name, or null where the number names none.
  @Nullable Lot lot(MagnetName name) {
    Code code = code(name);
    return code == null ? null : lots.get(code.id());
  }

  /// A piece of a lot, or null.
  @Nullable Piece piece(Lot lot, long number) {
    return pieces.getOrDefault(lot.id(), Map.of()).get(number);
  }
}
