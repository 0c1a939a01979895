package lodebook.ui.files;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/// A lot as a file states it.
///
/// @param lot the shop's number
/// @param type code of the magnet type
/// @param supplier who sent it
/// @param supplierLot the supplier's own number, empty where none is stated
/// @param received day on which it came
/// @param count magnets in it
/// @param certificate number of the certificate, may be empty
/// @param certificateRemanenceTesla remanence by the certificate, or null
/// @param location where it lies, may be empty
public record LotRow(
    String lot,
    String type,
    String supplier,
    String supplierLot,
    LocalDate received,
    int count,
    String certificate,
    @Nullable Double certificateRemanenceTesla,
    String location) {}
