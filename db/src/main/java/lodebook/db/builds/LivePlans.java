package lodebook.db.builds;

import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import lodebook.db.book.Writing;

/// The plan that counts for a rotor, and the pieces it keeps.
final class LivePlans {
  private LivePlans() {}

  /// Drops the plan of a rotor, if it has one; its pieces are free again.
  ///
  /// @return whether there was one
  static boolean drop(Writing writing, long rotorId, String rotor) {
    Long plan =
        writing
            .sql()
            .select(LIVE_PLAN.PLAN_ID)
            .from(LIVE_PLAN)
            .where(LIVE_PLAN.ROTOR_ID.eq(rotorId))
            .fetchOne(LIVE_PLAN.PLAN_ID);
    if (plan == null) {
      return false;
    }
    writing.sql().deleteFrom(RESERVED_PIECE).where(RESERVED_PIECE.PLAN_ID.eq(plan)).execute();
    writing.sql().deleteFrom(LIVE_PLAN).where(LIVE_PLAN.ROTOR_ID.eq(rotorId)).execute();
    writing.line().field("planDropped", rotor);
    return true;
  }
}
