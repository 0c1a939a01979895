package lodebook.assembly.plan;

import lodebook.assembly.magnet.Strength;

/// A measured piece that may be placed.
///
/// @param piece the piece's name in the shop, such as `L-2404/0017`
/// @param lot code of its lot
/// @param type code of its magnet type
/// @param strength its measured strength
public record Candidate(String piece, String lot, String type, Strength strength) {}
