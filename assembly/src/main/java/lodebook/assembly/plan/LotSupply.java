package lodebook.assembly.plan;

import lodebook.assembly.magnet.Strength;

/// Unmeasured magnets of a lot that may be placed: any of them is as good as another.
///
/// @param lot code of the lot
/// @param type code of its magnet type
/// @param count how many are free
/// @param strength mean strength of the lot; its uncertainty is the spread of single pieces (one
///   standard deviation)
public record LotSupply(String lot, String type, int count, Strength strength) {}
