package lodebook.ui.process;

/// What a command said.
///
/// @param code exit code
/// @param out standard output
/// @param err standard error
record Said(int code, String out, String err) {}
