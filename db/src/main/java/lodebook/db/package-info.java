/// The shop's book: tables, their history, and the shop's operations, each of them one transaction.
///
/// # How an operation is written
///
/// An operation is a public method of a class of its topic's package (`stock`, `builds` …), which
/// is made with a [lodebook.db.book.Book]. It takes and returns records, never jOOQ's. One that
/// writes is one call of [lodebook.db.book.Book#write]:
///
/// ```java
/// public void accept(Act act, String lot, String why) {
///   book.run(act, Permission.INSPECT, "lot accept", writing -> {
///     Code code = Codes.require(writing.sql(), lot, CodeKind.LOT);   // refuses unknown numbers
///     ... look, and refuse with a sentence that names the thing and the remedy ...
///     ... insert and update by writing.sql(); ids by writing.newId() ...
///     writing.line().subject(code.shown()).field("lot", code.shown()).field("why", why)
///         .now("lot", code.shown(), "accepted");
///   });
/// }
/// ```
///
/// - Inside, look first and refuse with [lodebook.db.refusal.Refusal]: a key of
///   `messages.properties`, its arguments, and the command that helps. Writers come one after the
///   other, so what was seen stays true until the end.
/// - An import checks all rows, collects a [lodebook.db.refusal.RowProblem] for each fault and
///   throws [lodebook.db.refusal.RowsRefused] before it writes anything.
/// - Every row of a fact carries `stated_at`, `recorded_at` and `history_sequence` from the
///   [lodebook.db.book.Writing]. Facts are never updated; what ends them has a table of its own.
/// - The line of history holds every field that is needed to do the operation again, and for each
///   thing whose state changed `now(kind, what, how)`, which `book verify` compares with the
///   tables. The kinds: `lot` (how: its state), `piece` (its state), `slot` (what `ROTOR/SLOT`, how
///   `LOT/NUMBER FACING` or `LOT FACING`, empty when emptied; the facing as `Double.toString` gives
///   it), `rotor` (its state), `layout` and `gear` (what `CODE@REVISION`, how `released`), `unit`
///   (its state), `member` (what `UNIT/POSITION`, how the rotor's number, empty when taken out),
///   `person` (what the initials, how `ROLE` or `ROLE retired`).
/// - A rule that the schema holds has a named constraint, an entry in the book's table of
///   constraints, a sentence in `messages.properties` and a test on both databases.
/// - Before a lot or a piece is put on hold, `stood_before_hold` is set on its live rows; when it
///   is freed, it is taken back. So the foreign keys on `clear` refuse new placements only.
/// - Reading is one call of [lodebook.db.book.Book#read]; it writes nothing.
/// - Long computing happens outside: read, compute, then write and look again whether what was read
///   still holds.
@NullMarked
package lodebook.db;

import org.jspecify.annotations.NullMarked;
