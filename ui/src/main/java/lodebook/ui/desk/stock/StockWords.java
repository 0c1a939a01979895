package lodebook.ui.desk.stock;

import java.util.List;
import javafx.scene.control.Label;
import lodebook.db.stock.LotState;
import lodebook.db.stock.Piece;
import lodebook.db.stock.StateChange;
import lodebook.ui.desk.room.Keys;
import lodebook.ui.desk.words.DeskWords;

/// How states, places and decisions are said in the stockroom.
final class StockWords {
  private final DeskWords words;

  StockWords(DeskWords words) {
    this.words = words;
  }

  String lotState(LotState state) {
    return words.say("lot." + state.word());
  }

  String pieceState(Piece piece) {
    return words.say("piece." + piece.state().word());
  }

  String where(Piece piece) {
    Piece.Slot stands = piece.stands();
    Piece.Cell lies = piece.lies();
    Piece.Slot planned = piece.planned();
    if (stands != null) {
      return words.say("stock.stands", stands.rotor(), words.number(stands.slot()));
    }
    String cell = lies == null ? "" : words.say("stock.cell", lies.tray(), lies.cell());
    return planned == null
        ? cell
        : words.say("stock.planned", cell, planned.rotor(), words.number(planned.slot()));
  }

  Label decisions(List<StateChange> decisions) {
    if (decisions.isEmpty()) {
      return Keys.words(words.say("stock.undecided"), "quiet");
    }
    StateChange last = decisions.getLast();
    return Keys.words(
        words.say(
            "stock.decided",
            state(last.state()),
            words.minute(last.statedAt()),
            last.by(),
            last.why()),
        "quiet");
  }

  String state(String word) {
    return switch (word) {
      case "usable", "scrapped" -> words.say("piece." + word);
      default -> words.say("lot." + word);
    };
  }
}
