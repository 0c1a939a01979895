package lodebook.db.units;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// One physical gear.
///
/// @param code its serial number
/// @param gear the gear model, `CODE@REVISION`
/// @param batch the batch of its rotors, or null
/// @param state `assembled` or `returned`
/// @param members what is or was in it, in the order of assembly
/// @param events what happened to it, in order
/// @param assembledAt when it was assembled
public record GearUnit(
    String code,
    String gear,
    @Nullable String batch,
    String state,
    List<Member> members,
    List<Event> events,
    Instant assembledAt) {
  public GearUnit {
    members = List.copyOf(members);
    events = List.copyOf(events);
  }

  /// Something that is or was in a unit.
  ///
  /// @param code its number
  /// @param position `inner` or `outer`
  /// @param from from when on
  /// @param to until when, or null while it is in
  /// @param why the reason for which a lead let it in against the rule, else empty
  public record Member(
      String code, String position, Instant from, @Nullable Instant to, String why) {}

  /// Something that happened to a unit.
  ///
  /// @param state the state from then on
  /// @param why a complaint, or empty
  /// @param by who recorded it
  /// @param at when, as stated
  public record Event(String state, String why, String by, Instant at) {}
}
