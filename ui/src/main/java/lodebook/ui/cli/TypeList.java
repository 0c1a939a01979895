package lodebook.ui.cli;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.magnet.MagnetType;
import lodebook.db.stock.MagnetTypes;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the magnet types.
@Command(
    name = "list",
    description = "List the magnet types.",
    footer = {"", "Example:", "  lodebook type list"})
final class TypeList extends Verb {

  TypeList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<MagnetType> types = session.read(book -> new MagnetTypes(book).list());
    Table table = new Table("TYPE", "SHAPE", "SIZE", "GRADE", ">RECOIL", "COATING");
    types.forEach(
        t ->
            table.row(
                t.code(),
                t.shape().name().toLowerCase(Locale.ROOT),
                size(t),
                t.grade(),
                Amounts.plain(t.recoilPermeability()),
                t.coating()));
    session.list(Json.list(types.stream().map(TypeList::json).toList()), table, "type.none");
    return 0;
  }

  /// The dimensions in words, in mm.
  static String size(MagnetType type) {
    String length = Amounts.millimetres(type.lengthMetres());
    String diameter = Amounts.millimetres(type.diameterMetres());
    return switch (type.shape()) {
      case BLOCK ->
          Amounts.millimetres(type.thicknessMetres())
              + " x "
              + Amounts.millimetres(type.widthMetres())
              + " x "
              + length
              + " mm";
      case DISC -> "dia " + diameter + " x " + Amounts.millimetres(type.thicknessMetres()) + " mm";
      case ROD -> "dia " + diameter + " x " + length + " mm";
      case ARC ->
          "dia "
              + diameter
              + "/"
              + Amounts.millimetres(type.innerDiameterMetres())
              + " x "
              + length
              + " mm, "
              + Amounts.degrees(type.arcDegrees())
              + " deg";
    };
  }

  private static Json json(MagnetType type) {
    return Json.object()
        .put("type", type.code())
        .put("shape", type.shape().name().toLowerCase(Locale.ROOT))
        .put("thicknessMillimetres", type.thicknessMetres() * 1000)
        .put("widthMillimetres", type.widthMetres() * 1000)
        .put("lengthMillimetres", type.lengthMetres() * 1000)
        .put("diameterMillimetres", type.diameterMetres() * 1000)
        .put("innerDiameterMillimetres", type.innerDiameterMetres() * 1000)
        .put("arcDegrees", type.arcDegrees())
        .put("grade", type.grade())
        .put("toleranceMillimetres", type.toleranceMetres() * 1000)
        .put("coating", type.coating())
        .put("recoilPermeability", type.recoilPermeability())
        .put("magnetisationDegrees", type.magnetisationDegrees());
  }
}
