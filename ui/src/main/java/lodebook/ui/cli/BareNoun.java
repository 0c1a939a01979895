package lodebook.ui.cli;

import java.util.List;
import java.util.concurrent.Callable;

/// A noun without a verb: shows which verbs there are; the command line is wrong.
///
/// @param name the noun
/// @param session the run
record BareNoun(String name, Session session) implements Callable<Integer> {
  @Override
  public Integer call() {
    Commands.find(Commands.whole(session), List.of(name)).usage(session.around().err());
    return Failures.WRONG_LINE;
  }
}
