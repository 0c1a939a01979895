package lodebook.assembly.survey;

import org.jspecify.annotations.Nullable;

/// By what all readings together would fit: two readings of the same evidence.
///
/// @param gain relative gain: readings are (1 + gain) times what was expected (−0.148 is −14.8 %),
///   or null if no gain makes them fit
/// @param probeOffsetMetres distance by which the probe was further from the axis than stated,
///   metres, or null if none makes them fit
public record WholeRing(@Nullable Double gain, @Nullable Double probeOffsetMetres) {}
