package lodebook.db.stock;

import java.util.List;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Strength;

/// Estimates how strong a piece is from all its readings.
@FunctionalInterface
public interface StrengthEstimator {
  /// The strength of a piece.
  ///
  /// @param type its type
  /// @param grade its type's grade
  /// @param readings at least one
  Strength estimate(MagnetType type, Grade grade, List<TakenReading> readings);
}
