package lodebook.assembly.survey;

/// An explanation weighed with its own covariance.
///
/// @param explanation what it says, amounts fitted
/// @param logWeight natural logarithm of prior times likelihood, amounts integrated out
/// @param misfit sum of squares of the whitened residuals at the best fit
/// @param fitProbability probability of a misfit at least as large
record Judged(Explanation explanation, double logWeight, double misfit, double fitProbability) {}
