package lodebook.ui.files;

import java.util.Arrays;
import java.util.List;
import java.util.function.Function;

/// An importer with a right file of its kind.
///
/// @param name what it reads
/// @param reader reads it
/// @param columns the columns that it knows, as its sentences list them
/// @param header header row of the right file: the columns that it must have
/// @param rows rows of the right file
/// @param many a right row of which a file may hold any number, each with another number at `#`
record Importer(
    String name,
    Function<Source, Rows<?>> reader,
    String columns,
    String header,
    List<String> rows,
    String many) {

  static final List<Importer> ALL =
      List.of(
          new Importer(
              "type",
              TypeFile::read,
              "type,shape,thickness_mm,width_mm,length_mm,diameter_mm,inner_diameter_mm,arc_deg,grade,tolerance_mm,coating,recoil_permeability,magnetisation_deg",
              "type,shape,thickness_mm,width_mm,length_mm,diameter_mm,inner_diameter_mm,arc_deg,grade,tolerance_mm,coating",
              List.of(
                  "BLK-4-4-10,block,4,4.5,10,,,,N42,0.05,Ni-Cu-Ni",
                  "DSC-8-3,disc,3,,,8,,,N42,0.1,zinc",
                  "ROD-4-12,rod,,,12,4,,,N45,0.05,",
                  "ARC-30-20,arc,,,10,30,20,44.5,N42,0.1,epoxy"),
              "T-#,block,4,4.5,10,,,,N42,0.05,Ni"),
          new Importer(
              "grade",
              GradeFile::read,
              "grade,br_low_mT,br_high_mT,br_percent_per_K,recoil_permeability,highest_temperature_C,density_kg_m3,source",
              "grade,br_low_mT,br_high_mT,br_percent_per_K,recoil_permeability,highest_temperature_C,density_kg_m3,source",
              List.of("N42X,1280,1320.5,-0.12,1.05,80,7500,our supplier"),
              "G-#,1280,1320.5,-0.12,1.05,80,7500,ours"),
          new Importer(
              "lot",
              LotFile::read,
              "lot,type,supplier,received,count,certificate,certificate_br_mT,location,supplier_lot",
              "lot,type,supplier,received,count,certificate,certificate_br_mT,location",
              List.of(
                  "L-2404,BLK-4-4-10,Example supply,2026-11-02,40,C-17,1301.5,shelf",
                  "L-2405,BLK-4-4-10,Example supply,2026-11-03,20,,,"),
              "L-#,BLK-4-4-10,Example supply,2026-11-03,20,,,"),
          new Importer(
              "piece",
              source -> PieceReadingFile.read(source, "L-2404", false),
              "piece,tray,cell,value,unit,standoff_mm,temperature_C,meter,by,at",
              "piece,tray,cell,value,unit,standoff_mm,temperature_C",
              List.of(
                  "1,C,1,325.973,mT,1.5,20", "L-2404/0002,C,2,3.26,kG,1.5,", "3,,,0.3,T,1.5,21.5"),
              "#,,,325.9,mT,1.0,20"),
          new Importer(
              "placement",
              PlacementFile::read,
              "slot,piece,facing_deg,at,by",
              "slot,piece,facing_deg",
              List.of("1,L-2404/0001,0", "2,L-2404/2,270.5", "3,L-2405,180"),
              "#,L-2405,180"),
          new Importer(
              "survey",
              source -> SurveyFile.read(source, true),
              "slot,spot,component,value,unit,temperature_C,radius_mm,height_mm,at,by,meter",
              "slot,spot,component,value,unit",
              List.of("1,centre,radial,422.95,mT", "1,to-next,tangential,-155.3,G"),
              "1,centre,radial,422.95,mT"),
          new Importer(
              "move",
              MoveFile::read,
              "piece,tray,cell",
              "piece,tray,cell",
              List.of("L-2404/0001,C,9", "L-2404/2,D,1"),
              "L-2404/#,C,#"));

  static Importer named(String name) {
    return ALL.stream().filter(i -> i.name.equals(name)).findFirst().orElseThrow();
  }

  String plain() {
    return header + "\n" + String.join("\n", rows) + "\n";
  }

  String row() {
    return rows.getFirst();
  }

  List<String> required() {
    return List.of(header.split(","));
  }

  List<?> read(Source source) {
    return reader.apply(source).all();
  }

  /// The right file with its columns in the opposite order.
  String turned() {
    StringBuilder text = new StringBuilder();
    for (String line : plain().split("\n")) {
      List<String> fields = Arrays.asList(line.split(",", -1));
      text.append(String.join(",", fields.reversed())).append('\n');
    }
    return text.toString();
  }

  @Override
  public String toString() {
    return name;
  }
}
