package lodebook.assembly.survey;

import java.util.List;

/// The likeliest explanation that names other magnets than the best, under the same measuring.
///
/// @param findings what it says is wrong; empty where it says that the ring is right
/// @param oddsAgainst how many times likelier the best explanation is
public record RunnerUp(List<NamedFault> findings, double oddsAgainst) {
  public RunnerUp {
    findings = List.copyOf(findings);
  }
}
