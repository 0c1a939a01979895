package lodebook.ui.process;

import java.util.ArrayList;
import java.util.List;

/// An importer of the command line with a right file of its kind.
///
/// @param command the command before the file
/// @param header columns of the right file
/// @param rows two rows of the right file
/// @param swapped two columns whose names are swapped by mistake
record Importer(List<String> command, String header, List<String> rows, List<String> swapped) {
  static final List<Importer> ALL =
      List.of(
          of(
              "grade import",
              "grade,br_low_mT,br_high_mT,br_percent_per_K,recoil_permeability,highest_temperature_C,density_kg_m3,source",
              "N42X,1280,1320.5,-0.12,1.05,80,7500,a supplier",
              "N42Y,1290,1330,-0.12,1.05,80,7500,a supplier",
              "br_low_mT,br_high_mT"),
          of(
              "type import",
              "type,shape,thickness_mm,width_mm,length_mm,diameter_mm,inner_diameter_mm,arc_deg,grade,tolerance_mm,coating",
              "B-1,block,4,4.5,10,,,,N42,0.05,Ni",
              "D-1,disc,3.5,,,8,,,N42,0.1,zinc",
              "type,shape"),
          of(
              "lot import",
              "lot,type,supplier,received,count,certificate,certificate_br_mT,location",
              "L-1,BLK-4-4-10,a supplier,2026-11-02,40,C-17,1301.5,shelf",
              "L-2,BLK-4-4-10,a supplier,2026-11-03,20,,,",
              "received,count"),
          of(
              "piece import L-3000",
              "piece,tray,cell,value,unit,standoff_mm,temperature_C,meter",
              "1,T,1,325.9,mT,1.5,20,GM-1",
              "2,T,2,3.26,kG,1.5,20,GM-1",
              "value,unit"),
          of("tray move", "piece,tray,cell", "L-2404/0001,B,1", "L-2404/0002,B,2", "piece,tray"),
          of(
              "place R-0001",
              "slot,piece,facing_deg",
              "1,L-2404/0001,0.5",
              "2,L-2404/0002,270",
              "piece,facing_deg"),
          of(
              "survey import R-0001 --meter GM-1",
              "slot,spot,component,value,unit",
              "1,centre,radial,422.9,mT",
              "1,to-next,tangential,-155.3,mT",
              "spot,component"));

  private static Importer of(
      String command, String header, String first, String second, String swapped) {
    return new Importer(
        List.of(command.split(" ")), header, List.of(first, second), List.of(swapped.split(",")));
  }

  /// The command on a file.
  List<String> on(String path) {
    List<String> line = new ArrayList<>(command);
    line.add(path);
    return line;
  }

  String right() {
    return header + "\n" + String.join("\n", rows) + "\n";
  }

  /// A file with a slip, by the slip's name.
  String with(String slip) {
    String first = rows.getFirst();
    return switch (slip) {
      case "missing" -> right().replaceFirst("^[^,]+,", "remark,");
      case "swapped" ->
          right()
              .replaceFirst(swapped.getFirst(), "#")
              .replaceFirst(swapped.getLast(), swapped.getFirst())
              .replaceFirst("#", swapped.getLast());
      case "repeated" -> right() + first + "\n";
      case "comma" -> right().replaceFirst("\\.(\\d)", ",$1");
      case "half" -> right() + first.substring(0, first.indexOf(',') + 2);
      default -> throw new IllegalArgumentException(slip);
    };
  }

  /// The right file as other programs write it: with a byte-order mark, `;` and decimal commas.
  String otherForm() {
    return "\uFEFF" + right().replace(',', ';').replace('.', ',').replace("\n", "\r\n");
  }

  @Override
  public String toString() {
    return String.join(" ", command);
  }
}
