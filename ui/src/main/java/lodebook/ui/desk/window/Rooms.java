package lodebook.ui.desk.window;

import java.util.List;
import javafx.beans.property.ObjectProperty;
import lodebook.ui.desk.bench.BenchModel;
import lodebook.ui.desk.bench.BenchRoom;
import lodebook.ui.desk.history.HistoryModel;
import lodebook.ui.desk.history.HistoryRoom;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.room.Doors;
import lodebook.ui.desk.room.Room;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.shop.ShopModel;
import lodebook.ui.desk.shop.ShopRoom;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.stock.StockModel;
import lodebook.ui.desk.stock.StockRoom;
import lodebook.ui.desk.survey.SurveyModel;
import lodebook.ui.desk.survey.SurveyRoom;
import lodebook.ui.desk.trace.TraceModel;
import lodebook.ui.desk.trace.TraceRoom;
import lodebook.ui.desk.waiting.WaitingModel;
import lodebook.ui.desk.waiting.WaitingRoom;
import lodebook.ui.desk.words.DeskWords;

/// The rooms in the order of the day.
final class Rooms {
  private Rooms() {}

  static List<Room> all(Station station, Runner runner, ObjectProperty<Look> look, Doors doors) {
    DeskWords words = station.words();
    return List.of(
        new WaitingRoom(new WaitingModel(station, runner), words, doors),
        new StockRoom(new StockModel(station, runner), look, doors),
        new BenchRoom(new BenchModel(station, runner), look, doors),
        new SurveyRoom(new SurveyModel(station, runner), look),
        new TraceRoom(new TraceModel(station, runner), words, look, doors),
        new HistoryRoom(new HistoryModel(station, runner), words),
        new ShopRoom(new ShopModel(station, runner)));
  }
}
