package lodebook.ui.cli;

import java.util.List;
import java.util.function.Function;

/// What commands are about, and its verbs.
///
/// @param name the word on the command line
/// @param verbs makes its commands
record Noun(String name, Function<Session, List<Verb>> verbs) {}
