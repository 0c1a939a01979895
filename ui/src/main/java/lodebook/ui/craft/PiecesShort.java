package lodebook.ui.craft;

import java.util.List;
import lodebook.assembly.plan.Shortage;

/// There are too few magnets to plan from; said before anything is planned.
public final class PiecesShort extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final transient List<Shortage> shortages;

  /// What is short, type by type.
  public PiecesShort(List<Shortage> shortages) {
    super(shortages.toString());
    this.shortages = List.copyOf(shortages);
  }

  /// What is short, type by type.
  public List<Shortage> shortages() {
    return shortages;
  }
}
