package lodebook.db.builds;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLAN;
import static lodebook.db.tables.Tables.PLANNED_PLACEMENT;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.Candidate;
import lodebook.assembly.plan.LotSupply;
import lodebook.assembly.plan.Placement;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.builds.BenchStock.Lot;
import lodebook.db.builds.BenchStock.Piece;
import lodebook.db.builds.Putting.Standing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.RotorRecord;
import org.jooq.DSLContext;

/// Reading what rotors may be planned from, and storing plans. The planning itself happens between
/// the two, with the book closed.
public final class Plans {
  private final Book book;

  /// Plans of an open book.
  public Plans(Book book) {
    this.book = book;
  }

  /// What may be planned from.
  ///
  /// @param rotors open rotors
  /// @param lots accepted lots to take from
  public PlanStock stockFor(List<String> rotors, List<String> lots) {
    return book.read(
        sql -> {
          List<RotorRecord> rows =
              rotors.stream().map(each -> Rotors.require(sql, each)).distinct().toList();
          FreeStock free = new FreeStock(sql, rows.stream().map(RotorRecord::getId).toList());
          List<BatchTask.Ring> rings = new ArrayList<>();
          for (RotorRecord row : rows) {
            Rotor rotor = Rotors.byId(sql, row.getId());
            Rotors.requireOpen(rotor);
            rings.add(
                new BatchTask.Ring(rotor.code(), Rotors.design(sql, row), free.kept(row.getId())));
          }
          List<Candidate> candidates = new ArrayList<>();
          List<LotSupply> unmeasured = new ArrayList<>();
          for (long lot : lots.stream().map(each -> clearLot(sql, each)).distinct().toList()) {
            candidates.addAll(free.pieces(lot));
            LotSupply supply = free.unmeasured(lot);
            if (supply.count() > 0) {
              unmeasured.add(supply);
            }
          }
          long seen = sql.select(CHAIN_HEAD.SEQUENCE).from(CHAIN_HEAD).fetchSingle().value1();
          return new PlanStock(rings, candidates, unmeasured, seen);
        });
  }

  private static long clearLot(DSLContext sql, String code) {
    Code lot = Codes.require(sql, code, CodeKind.LOT);
    String state =
        sql.select(LOT.STATE).from(LOT).where(LOT.ID.eq(lot.id())).fetchSingle().value1();
    return switch (state) {
      case "accepted" -> lot.id();
      case "awaiting" ->
          throw Refusal.refused("plan.lot-awaiting", lot.shown())
              .remedy("lodebook lot accept " + lot.shown() + " --why TEXT");
      case "held" ->
          throw Refusal.refused("plan.lot-held", lot.shown())
              .remedy("lodebook lot free " + lot.shown() + " --why TEXT");
      default ->
          throw Refusal.refused("plan.lot-rejected", lot.shown())
              .remedy("lodebook lot show " + lot.shown());
    };
  }

  /// Stores plans, all or none; each supersedes its rotor's plan before, and keeps its pieces.
  ///
  /// @throws PlanOutdated if something that a plan needs was taken since the stock was read: plan
  ///   once more
  public List<Plan> store(Act act, PlanStock stock, List<PlanDraft> drafts) {
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "plan",
        writing -> {
          Map<String, Long> rotors = new LinkedHashMap<>();
          for (PlanDraft draft : drafts) {
            RotorRecord row = Rotors.require(writing.sql(), draft.rotor());
            Rotors.requireOpen(Rotors.byId(writing.sql(), row.getId()));
            requirePlanner(writing, row.getId());
            LivePlans.drop(writing, row.getId(), draft.rotor());
            rotors.put(draft.rotor(), row.getId());
          }
          List<Plan> plans = new ArrayList<>();
          for (PlanDraft draft : drafts) {
            store(writing, rotors.getOrDefault(draft.rotor(), 0L), stock.seen(), draft);
          }
          rotors.forEach(
              (rotor, id) -> {
                Plan plan = PlanRows.fetch(writing.sql(), id, rotor);
                if (plan != null) {
                  plans.add(plan);
                }
              });
          return plans;
        });
  }

  /// A planner plans; who built at a rotor may plan its empty slots anew.
  private static void requirePlanner(Writing writing, long rotorId) {
    boolean own =
        writing
            .sql()
            .fetchExists(
                PLACEMENT,
                PLACEMENT.ROTOR_ID.eq(rotorId).and(PLACEMENT.PERSON_ID.eq(writing.person().id())));
    if (!own) {
      writing.require(Permission.DESIGN);
    }
  }

  private static void store(Writing writing, long rotorId, long seen, PlanDraft draft) {
    DSLContext sql = writing.sql();
    Map<Integer, Standing> standing = SlotWriter.standing(sql, rotorId);
    BenchStock bench =
        new BenchStock(
            sql, draft.plan().placements().stream().map(Plans::name).distinct().toList());
    long planId = writing.newId();
    sql.insertInto(PLAN)
        .set(PLAN.ID, planId)
        .set(PLAN.ROTOR_ID, rotorId)
        .set(PLAN.SEED, draft.plan().seed())
        .set(PLAN.SETTINGS, draft.settings())
        .set(PLAN.PROGRAM_VERSION, draft.programVersion())
        .set(PLAN.STOCK_SEQUENCE, seen)
        .set(PLAN.UNWANTED_HARMONICS, draft.plan().unwantedHarmonics())
        .set(PLAN.LOWER_BOUND, draft.plan().lowerBound())
        .set(PLAN.AS_THEY_COME, draft.plan().asTheyCome())
        .set(PLAN.WORKING_AMPLITUDE_TESLA, draft.plan().workingAmplitudeTesla())
        .set(PLAN.PERSON_ID, writing.person().id())
        .set(PLAN.STATED_AT, writing.statedAt())
        .set(PLAN.RECORDED_AT, writing.recordedAt())
        .set(PLAN.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing
        .line()
        .subject(draft.rotor())
        .field("rotor", draft.rotor())
        .field("seed", draft.plan().seed())
        .field("settings", draft.settings())
        .field("program", draft.programVersion())
        .field("stockSequence", seen)
        .field("unwantedHarmonics", draft.plan().unwantedHarmonics())
        .field("lowerBound", draft.plan().lowerBound())
        .field("asTheyCome", draft.plan().asTheyCome())
        .field("workingAmplitudeTesla", draft.plan().workingAmplitudeTesla());
    for (Placement placement : draft.plan().placements()) {
      Standing stands = standing.get(placement.slot());
      String magnet = name(placement).toString();
      if (placement.kept() != (stands != null)
          || (stands != null && !stands.magnet().equals(magnet))) {
        throw new PlanOutdated(
            "lodebook plan " + draft.rotor(), "plan.slot-changed", draft.rotor(), placement.slot());
      }
      if (!placement.kept()) {
        insert(writing, planId, draft, placement, bench);
      }
    }
    sql.insertInto(LIVE_PLAN, LIVE_PLAN.ROTOR_ID, LIVE_PLAN.PLAN_ID)
        .values(rotorId, planId)
        .execute();
  }

  private static void insert(
      Writing writing, long planId, PlanDraft draft, Placement placement, BenchStock bench) {
    MagnetName name = name(placement);
    Lot lot = bench.lot(name);
    if (lot == null || !lot.clear()) {
      throw outdated(draft, "plan.lot-gone", name.lot());
    }
    Piece piece = name.number() == null ? null : bench.piece(lot, name.number());
    if (name.number() != null) {
      requireFree(draft, name, piece);
    }
    int slot = placement.slot();
    long step = draft.fillSteps().getOrDefault(slot, slot);
    writing
        .sql()
        .insertInto(PLANNED_PLACEMENT)
        .set(PLANNED_PLACEMENT.PLAN_ID, planId)
        .set(PLANNED_PLACEMENT.SLOT, (long) slot)
        .set(PLANNED_PLACEMENT.LOT_ID, lot.id())
        .set(PLANNED_PLACEMENT.PIECE_ID, piece == null ? null : piece.id())
        .set(PLANNED_PLACEMENT.FACING_DEGREES, placement.facing().degrees())
        .set(PLANNED_PLACEMENT.FILL_STEP, step)
        .set(PLANNED_PLACEMENT.REMARK, draft.remarks().getOrDefault(slot, ""))
        .execute();
    if (piece != null) {
      writing
          .sql()
          .insertInto(
              RESERVED_PIECE, RESERVED_PIECE.PIECE_ID, RESERVED_PIECE.PLAN_ID, RESERVED_PIECE.SLOT)
          .values(piece.id(), planId, (long) slot)
          .execute();
    } else if (lot.free() < 1) {
      throw outdated(draft, "plan.lot-used-up", lot.code());
    }
    writing
        .line()
        .subject(name.toString())
        .row(
            List.of(
                Integer.toString(slot),
                name.toString(),
                Double.toString(placement.facing().degrees()),
                Long.toString(step),
                draft.remarks().getOrDefault(slot, "")));
  }

  private static void requireFree(
      PlanDraft draft, MagnetName name, @org.jspecify.annotations.Nullable Piece piece) {
    if (piece == null || !piece.state().equals("usable")) {
      throw outdated(draft, "plan.piece-unusable", name);
    }
    BenchStock.Stand stand = piece.standsIn();
    if (stand != null) {
      throw outdated(draft, "plan.piece-placed", name, stand.rotor(), stand.slot());
    }
    if (piece.keptFor() != null) {
      throw outdated(draft, "plan.piece-kept", name, piece.keptFor());
    }
  }

  private static PlanOutdated outdated(PlanDraft draft, String key, Object... arguments) {
    return new PlanOutdated("lodebook plan " + draft.rotor(), key, arguments);
  }

  private static MagnetName name(Placement placement) {
    String piece = placement.piece();
    return MagnetName.of(piece == null ? placement.lot() : piece);
  }

  /// The plan that counts for a rotor; a rotor without one refuses.
  public Plan show(String rotor) {
    return book.read(
        sql -> {
          RotorRecord row = Rotors.require(sql, rotor);
          String code = Rotors.byId(sql, row.getId()).code();
          Plan plan = PlanRows.fetch(sql, row.getId(), code);
          if (plan == null) {
            throw none(code);
          }
          return plan;
        });
  }

  /// Drops the plans of rotors; pieces that aren't built in are free again.
  public void drop(Act act, List<String> rotors) {
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "plan drop",
        writing -> {
          for (String rotor : rotors) {
            RotorRecord row = Rotors.require(writing.sql(), rotor);
            String code = Rotors.byId(writing.sql(), row.getId()).code();
            requirePlanner(writing, row.getId());
            writing.line().subject(code);
            if (!LivePlans.drop(writing, row.getId(), code)) {
              throw none(code);
            }
          }
        });
  }

  private static Refusal none(String rotor) {
    return Refusal.refused("plan.none", rotor)
        .remedy("lodebook plan " + rotor + " --from LOT[,LOT…]");
  }
}
