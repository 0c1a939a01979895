package lodebook.ui.craft;

import lodebook.assembly.layout.Layout;
import lodebook.assembly.plan.FillingStep;

/// Puts a step of filling into words.
@FunctionalInterface
public interface StepWords {
  /// What a builder is told about a step, empty for nothing.
  String of(Layout layout, FillingStep step);
}
