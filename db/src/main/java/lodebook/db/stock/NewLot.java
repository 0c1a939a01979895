package lodebook.db.stock;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/// A lot as it is received.
///
/// @param lot its number
/// @param type name of its magnet type
/// @param supplier who sent it
/// @param supplierLot the supplier's own number, or empty
/// @param received the day
/// @param count how many pieces, 1 or more
/// @param certificate the certificate's number, or empty
/// @param certificateRemanenceTesla remanence by the certificate, tesla, or null
/// @param location where it is kept, or empty
public record NewLot(
    String lot,
    String type,
    String supplier,
    String supplierLot,
    LocalDate received,
    int count,
    String certificate,
    @Nullable Double certificateRemanenceTesla,
    String location) {}
