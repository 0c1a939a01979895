package lodebook.db.stock;

/// What an import of piece readings did.
///
/// @param readings readings taken in
/// @param pieces pieces they belong to
/// @param newPieces of these, pieces that had no number before
/// @param withoutMeter readings without an instrument, taken as good to 1 %
/// @param withoutTemperature readings without a temperature, taken as 20 °C ± 3 K
public record ImportedReadings(
    int readings, int pieces, int newPieces, int withoutMeter, int withoutTemperature) {}
