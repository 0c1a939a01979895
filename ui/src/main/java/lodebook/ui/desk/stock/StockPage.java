package lodebook.ui.desk.stock;

import java.util.List;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetType;
import lodebook.db.stock.Lot;
import lodebook.db.stock.LotState;
import lodebook.db.stock.Piece;
import lodebook.db.stock.PieceReading;
import lodebook.db.stock.StateChange;
import lodebook.db.stock.Trays;
import org.jspecify.annotations.Nullable;

/// What of the stock is looked at.
public sealed interface StockPage {
  /// All lots.
  record Everything(List<Lot> lots) implements StockPage {
    public Everything {
      lots = List.copyOf(lots);
    }
  }

  /// One lot with its pieces.
  ///
  /// @param lot the lot
  /// @param type its magnet type
  /// @param grade the type's grade, or null where the book does not know it
  /// @param pieces its numbered pieces
  /// @param decisions what was decided about it, in order
  record OneLot(
      Lot lot,
      MagnetType type,
      @Nullable Grade grade,
      List<Piece> pieces,
      List<StateChange> decisions)
      implements StockPage {
    public OneLot {
      pieces = List.copyOf(pieces);
      decisions = List.copyOf(decisions);
    }

    /// How many pieces may be planned or placed now, unmeasured ones counted.
    public int free() {
      if (lot.state() != LotState.ACCEPTED) {
        return 0;
      }
      long planned = pieces.stream().filter(p -> p.planned() != null).count();
      return (int) Math.max(0, lot.left() - lot.held() - planned);
    }
  }

  /// One piece.
  record OnePiece(Piece piece, List<PieceReading> readings, List<StateChange> decisions)
      implements StockPage {
    public OnePiece {
      readings = List.copyOf(readings);
      decisions = List.copyOf(decisions);
    }
  }

  /// One tray, cell by cell.
  record OneTray(String tray, List<Trays.Content> cells) implements StockPage {
    public OneTray {
      cells = List.copyOf(cells);
    }
  }
}
