/// What readings round a ring should be, and what they show: which magnet is wrong, what the person
/// measuring did, how sure that is, and what to measure next.
@NullMarked
package lodebook.assembly.survey;

import org.jspecify.annotations.NullMarked;
