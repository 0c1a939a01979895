package lodebook.db.builds;

import lodebook.db.refusal.Notice;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RefusalKind;

/// Between reading the stock and storing the plan something that the plan needs was taken: plan
/// once more; if that happens again, let the refusal stand.
public final class PlanOutdated extends Refusal {
  private static final long serialVersionUID = 1;

  PlanOutdated(String remedy, String key, Object... arguments) {
    super(RefusalKind.REFUSED, Notice.of(key, arguments), remedy);
  }
}
