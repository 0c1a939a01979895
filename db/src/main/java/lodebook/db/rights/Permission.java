package lodebook.db.rights;

import java.util.Arrays;
import java.util.stream.Collectors;

/// The things that not everybody may do, and who may.
public enum Permission {
  /// What every role may do: place, survey, move trays, put on hold and whatever no table names.
  ANYTHING_ELSE,
  /// Sample, inspect, accept, reject, free, test, and everything about meters.
  INSPECT,
  /// Types, grades, layouts, gear models, batches, plans, assembling and shipping.
  DESIGN,
  /// People, settings, deviations, overrides, dispositions, restore, upgrade, and correcting what
  /// another person recorded.
  LEAD,
  /// Adding a person: a lead's business, but nobody's in a book without people.
  ADD_PERSON,
  /// Making a new book, which nobody signs.
  CREATE_BOOK;

  /// Whether a role may do it.
  public boolean allows(Role role) {
    return role == Role.LEAD
        || switch (this) {
          case ANYTHING_ELSE -> true;
          case INSPECT -> role == Role.INSPECTOR;
          case DESIGN -> role == Role.PLANNER;
          case LEAD, ADD_PERSON, CREATE_BOOK -> false;
        };
  }

  /// The roles that may, in words: `inspector or lead`.
  public String words() {
    return Arrays.stream(Role.values())
        .filter(this::allows)
        .map(Role::word)
        .collect(Collectors.joining(" or "));
  }
}
