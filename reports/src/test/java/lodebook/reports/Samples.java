package lodebook.reports;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.IntFunction;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.assembly.safety.HandlingFigures;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingPicture;
import lodebook.reports.sheet.PaperSize;
import lodebook.reports.sheet.SheetFacts;
import lodebook.reports.traveller.ExpectedReading;
import lodebook.reports.traveller.Step;
import lodebook.reports.traveller.Traveller;
import org.jspecify.annotations.Nullable;

/// Invented rings and travellers for tests and for the pictures of the papers.
public final class Samples {
  /// The European alphabets beyond ASCII, with the signs of the trade.
  public static final String ALPHABETS =
      "ÀÁÂÃÄÅÆÇÈÉÊËÌÍÎÏÐÑÒÓÔÕÖØÙÚÛÜÝÞßàáâãäåæçèéêëìíîïðñòóôõöøùúûüýþÿĀāĂăĄąĆćĈĉĊċČčĎďĐđĒēĖėĘęĚěĜĝĞğĠġĢģĤĥĦħĨĩĪīĮįİıĴĵĶķĹĺĻļĽľĿŀŁłŃńŅņŇňŌōŐőŒœŔŕŖŗŘřŚśŜŝŞşŠšŢţŤťŨũŪūŬŭŮůŰűŲųŴŵŶŷŸŹźŻżŽžȘșȚțẀẁẂẃẄẅẞ"
          + "ΑΒΓΔΕΖΗΘΙΚΛΜΝΞΟΠΡΣΤΥΦΧΨΩαβγδεζηθικλμνξοπρσςτυφχψωάέήίόύώϊϋΐΰ"
          + "АБВГДЕЖЗИЙКЛМНОПРСТУФХЦЧШЩЪЫЬЭЮЯабвгдежзийклмнопрстуфхцчшщъыьэюяЁёЂђЃѓЄєЅѕІіЇїЈјЉљЊњЋћЌќЎўЏџҐґ"
          + "µΩ°−±·×²³½„“”‚‘’«»–—…€";

  private Samples() {}

  /// A block 4 × 4 × 10 mm.
  public static MagnetType block(double thickness, double width, double length) {
    return new MagnetType(
        "BLK-4-4-10",
        Shape.BLOCK,
        thickness * 1e-3,
        width * 1e-3,
        length * 1e-3,
        0,
        0,
        0,
        "N42",
        5e-5,
        "Ni-Cu-Ni",
        1.05,
        0);
  }

  /// Another shape: disc, rod or arc with dimensions in millimetres.
  public static MagnetType round(
      Shape shape, double thickness, double length, double diameter, double inner, double arc) {
    return new MagnetType(
        shape + "-1",
        shape,
        thickness * 1e-3,
        0,
        length * 1e-3,
        diameter * 1e-3,
        inner * 1e-3,
        arc,
        "N42",
        5e-5,
        "Zn",
        1.05,
        0);
  }

  /// A layout with k magnets per pole pair.
  public static Layout layout(
      int polePairs, int perPair, Focus focus, double radius, double working, boolean turns) {
    return new Layout(
        focus == Focus.OUT ? "STIR-IN" : "STIR-OUT",
        "A",
        polePairs,
        perPair,
        focus,
        Numbering.CLOCKWISE,
        0,
        Facing.OUT,
        radius * 1e-3,
        "BLK-4-4-10",
        null,
        working * 1e-3,
        new Probe(
            working * 1e-3,
            0,
            List.of(Spot.CENTRE),
            List.of(Component.RADIAL, Component.TANGENTIAL)),
        Spread.DEFAULT,
        "two-part epoxy, 5 min",
        5.0,
        turns,
        InsertFrom.FACE,
        0.03);
  }

  /// Facts of a sheet on A4 in English.
  public static SheetFacts facts(String code) {
    return new SheetFacts(
        code,
        "STIR-IN rev A",
        "the shop's book",
        "AB",
        OffsetDateTime.parse("2026-12-01T14:05:00+01:00"),
        1234,
        "9f3a01c7",
        1,
        PaperSize.A4,
        Locale.ENGLISH);
  }

  /// A ring whose slots come from the lots in turn of the function.
  public static RingPicture picture(
      Layout layout, MagnetType type, String title, IntFunction<@Nullable String> lot) {
    List<DrawnSlot> slots =
        IntStream.rangeClosed(1, layout.slots())
            .mapToObj(s -> new DrawnSlot(s, layout.ruleFacing(s), lot.apply(s), null))
            .toList();
    return new RingPicture(
        layout, type, null, title, slots, Face.MARKED, null, List.of(), Locale.ENGLISH);
  }

  /// Radial and tangential readings of an ideal ring, strong on the working side.
  public static List<ExpectedReading> expected(Layout layout, int slot) {
    double f = layout.ruleFacing(slot).radians();
    return List.of(
        new ExpectedReading(
            new ProbePoint(slot, Spot.CENTRE, Component.RADIAL), 0.4535 * Math.cos(f), 0.012),
        new ExpectedReading(
            new ProbePoint(slot, Spot.CENTRE, Component.TANGENTIAL), -0.358 * Math.sin(f), 0.0092));
  }

  /// A traveller of measured pieces in the order of slots.
  public static Traveller traveller(SheetFacts facts, Layout layout, MagnetType type) {
    List<Step> steps = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      steps.add(
          new Step(
              slot,
              slot % 3 == 0 ? "L-2405" : "L-2404",
              "%s/%04d".formatted(slot % 3 == 0 ? "L-2405" : "L-2404", 7 * slot % 300 + 1),
              "C",
              Integer.toString(slot),
              layout.ruleFacing(slot),
              null,
              expected(layout, slot),
              false));
    }
    return traveller(facts, layout, type, steps, false, List.of());
  }

  /// A traveller with the given steps.
  public static Traveller traveller(
      SheetFacts facts,
      Layout layout,
      MagnetType type,
      List<Step> steps,
      boolean inFillingOrder,
      List<ExpectedReading> finished) {
    return new Traveller(
        facts,
        layout,
        type,
        null,
        "B-7",
        "GEAR-1 rev A",
        steps,
        inFillingOrder,
        inFillingOrder
            ? List.of("Order of filling: every second slot, then those between.")
            : List.of(),
        finished,
        new HandlingFigures(27.3, 0.0412, 0.0943, 0.0219, 80));
  }
}
