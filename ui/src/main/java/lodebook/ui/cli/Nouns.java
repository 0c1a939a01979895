package lodebook.ui.cli;

import java.util.List;

/// All nouns and their verbs, in the order of the day.
final class Nouns {
  private Nouns() {}

  /// The nouns.
  static List<Noun> all() {
    return List.of(
        new Noun("book", Nouns::book),
        new Noun("person", Nouns::person),
        new Noun("meter", s -> List.of(new MeterAdd(s), new MeterList(s))),
        new Noun("grade", s -> List.of(new GradeImport(s), new GradeList(s))),
        new Noun("type", s -> List.of(new TypeImport(s), new TypeList(s))),
        new Noun("lot", Nouns::lot),
        new Noun("piece", Nouns::piece),
        new Noun("tray", s -> List.of(new TrayShow(s), new TrayMove(s), new TrayUnsure(s))),
        new Noun("layout", Nouns::layout),
        new Noun(
            "gear",
            s -> List.of(new GearTakeIn(s), new GearList(s), new GearShow(s), new GearRelease(s))),
        new Noun("batch", s -> List.of(new BatchOpen(s), new BatchList(s), new BatchShow(s))),
        new Noun("rotor", Nouns::rotor),
        new Noun("survey", Nouns::survey),
        new Noun("unit", Nouns::unit),
        new Noun("paper", s -> List.of(new PaperTraveller(s))));
  }

  private static List<Verb> book(Session s) {
    return List.of(
        new BookCreate(s),
        new BookShow(s),
        new BookVerify(s),
        new BookUpgrade(s),
        new BookBackup(s),
        new BookRestore(s),
        new BookExport(s),
        new BookSetting(s));
  }

  private static List<Verb> person(Session s) {
    return List.of(new PersonAdd(s), new PersonRole(s), new PersonRetire(s), new PersonList(s));
  }

  private static List<Verb> lot(Session s) {
    return List.of(
        new LotReceive(s),
        new LotList(s),
        new LotShow(s),
        new LotAccept(s),
        new LotHold(s),
        new LotFree(s),
        new LotReject(s),
        new LotCount(s));
  }

  private static List<Verb> piece(Session s) {
    return List.of(
        new PieceTakeIn(s),
        new PieceList(s),
        new PieceShow(s),
        new PieceHold(s),
        new PieceFree(s),
        new PieceScrap(s));
  }

  private static List<Verb> layout(Session s) {
    return List.of(
        new LayoutTakeIn(s),
        new LayoutList(s),
        new LayoutShow(s),
        new LayoutRelease(s),
        new LayoutProbe(s),
        new LayoutPicture(s));
  }

  private static List<Verb> rotor(Session s) {
    return List.of(new RotorOpen(s), new RotorList(s), new RotorShow(s), new RotorScrap(s));
  }

  private static List<Verb> survey(Session s) {
    return List.of(new SurveyTakeIn(s), new SurveyCheck(s), new SurveyVoid(s), new SurveyMove(s));
  }

  private static List<Verb> unit(Session s) {
    return List.of(new UnitAssemble(s), new UnitReturn(s), new UnitList(s), new UnitShow(s));
  }

  /// The commands that are one word.
  static List<Verb> alone(Session session) {
    return List.of(
        new PlanCommand(session),
        new PlaceCommand(session),
        new TraceCommand(session),
        new HistoryCommand(session),
        new DemoCommand(session),
        new CompletionCommand(session),
        new HelpCommand(session));
  }
}
