package lodebook.db.stock;

import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.LOT_STATE;
import static lodebook.db.tables.Tables.PIECE;

import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.LotRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Deciding about lots: accepting, holding, freeing, rejecting, counting.
public final class LotDecisions {
  private final Book book;

  /// Deciding about the lots of a book.
  public LotDecisions(Book book) {
    this.book = book;
  }

  /// Lets a lot be planned and placed. A lot on hold must be freed first.
  public void accept(Act act, String lot, String why) {
    book.run(
        act,
        Permission.INSPECT,
        "lot accept",
        writing -> {
          Found found = find(writing, lot);
          refuseIf(found, LotState.ACCEPTED);
          refuseIf(found, LotState.HELD);
          change(writing, found, LotState.ACCEPTED, null, why);
        });
  }

  /// Puts a lot aside: nothing of it is planned or placed until it is freed.
  public void hold(Act act, String lot, String why) {
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "lot hold",
        writing -> {
          Found found = find(writing, lot);
          refuseIf(found, LotState.HELD);
          refuseIf(found, LotState.REJECTED);
          change(writing, found, LotState.HELD, found.state(), why);
        });
  }

  /// Ends a hold: the lot is again what it was before.
  public LotState free(Act act, String lot, String why) {
    return book.write(
        act,
        Permission.INSPECT,
        "lot free",
        writing -> {
          Found found = find(writing, lot);
          if (found.state() != LotState.HELD) {
            throw Refusal.refused("lot.not-held", found.code().shown(), found.state().words())
                .remedy("lodebook lot show " + found.code().shown());
          }
          LotState before = LotState.of(String.valueOf(found.row().getStateBeforeHold()));
          change(writing, found, before, null, why);
          return before;
        });
  }

  /// Says that a lot is not to be used; this ends a hold as well.
  public void reject(Act act, String lot, String why) {
    book.run(
        act,
        Permission.INSPECT,
        "lot reject",
        writing -> {
          Found found = find(writing, lot);
          refuseIf(found, LotState.REJECTED);
          change(writing, found, LotState.REJECTED, null, why);
        });
  }

  /// Says how many pieces a lot really has. It cannot have fewer than are placed and scrapped, nor
  /// fewer than have a number.
  public void count(Act act, String lot, int count, String why) {
    if (count < 1) {
      throw Refusal.wrongInput("lot.count", count)
          .remedy("lodebook lot count " + lot + " N --why TEXT");
    }
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "lot count",
        writing -> {
          Found found = find(writing, lot);
          long used = found.row().getPlacedCount() + found.row().getScrappedCount();
          int numbered = writing.sql().fetchCount(PIECE, PIECE.LOT_ID.eq(found.code().id()));
          if (count < Math.max(used, numbered)) {
            throw Refusal.refused("lot.count-below", found.code().shown(), count, used, numbered)
                .remedy("lodebook piece list " + found.code().shown());
          }
          found.row().setPieceCount((long) count);
          found.row().store();
          writing
              .line()
              .subject(found.code().shown())
              .field("lot", found.code().shown())
              .field("count", count)
              .field("why", why);
        });
  }

  private record Found(Code code, LotRecord row) {
    LotState state() {
      return LotState.of(row.getState());
    }
  }

  private static Found find(Writing writing, String lot) {
    Code code = Codes.require(writing.sql(), lot, CodeKind.LOT);
    return new Found(code, writing.sql().selectFrom(LOT).where(LOT.ID.eq(code.id())).fetchSingle());
  }

  private static void refuseIf(Found found, LotState state) {
    if (found.state() == state) {
      String command = state == LotState.HELD ? "lodebook lot free " : "lodebook lot show ";
      String why = state == LotState.HELD ? " --why TEXT" : "";
      throw Refusal.refused("lot.is-already", found.code().shown(), state.words())
          .remedy(command + found.code().shown() + why);
    }
  }

  private static void change(
      Writing writing, Found found, LotState to, @Nullable LotState beforeHold, String why) {
    DSLContext sql = writing.sql();
    long lot = found.code().id();
    boolean clear = to == LotState.ACCEPTED;
    if (!clear) {
      standsBeforeHold(sql, lot, true);
    }
    LotRecord row = found.row();
    row.setState(to.word());
    row.setStateBeforeHold(beforeHold == null ? null : beforeHold.word());
    row.setClear(clear);
    row.store();
    if (clear) {
      standsBeforeHold(sql, lot, false);
    }
    sql.insertInto(LOT_STATE)
        .set(LOT_STATE.ID, writing.newId())
        .set(LOT_STATE.LOT_ID, lot)
        .set(LOT_STATE.STATE, to.word())
        .set(LOT_STATE.WHY, why)
        .set(LOT_STATE.PERSON_ID, writing.person().id())
        .set(LOT_STATE.STATED_AT, writing.statedAt())
        .set(LOT_STATE.RECORDED_AT, writing.recordedAt())
        .set(LOT_STATE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing
        .line()
        .subject(found.code().shown())
        .field("lot", found.code().shown())
        .field("why", why)
        .now("lot", found.code().shown(), to.word());
  }

  private static void standsBeforeHold(DSLContext sql, long lot, boolean stands) {
    sql.update(LIVE_SLOT)
        .set(LIVE_SLOT.STOOD_BEFORE_HOLD, stands)
        .where(LIVE_SLOT.LOT_ID.eq(lot))
        .execute();
  }
}
