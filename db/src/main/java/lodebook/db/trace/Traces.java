package lodebook.db.trace;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import lodebook.db.book.Book;
import lodebook.db.trace.Links.Link;
import org.jspecify.annotations.Nullable;

/// Tracing any number of the shop both ways.
public final class Traces {
  private final Book book;

  /// Traces in an open book.
  public Traces(Book book) {
    this.book = book;
  }

  /// What a thing was made from and what it went into.
  ///
  /// @param code a number of the shop, a piece `LOT/NUMBER`, or a supplier's lot
  public Trace trace(String code) {
    return book.read(
        sql -> {
          Things things = new Things(sql);
          Thing thing = things.named(code);
          Links links = new Links(sql, things);
          List<TraceNode> others = new ArrayList<>();
          if (!thing.kind().equals("supplier lot")) {
            for (Thing lot : things.supplied(code)) {
              others.add(node(Link.always(lot), List.of()));
            }
          }
          Walk made = new Walk(links::madeFrom);
          Walk went = new Walk(links::wentInto);
          return new Trace(
              thing.code(),
              thing.kind(),
              thing.at(),
              thing.state(),
              made.branches(thing),
              went.branches(thing),
              others);
        });
  }

  private static TraceNode node(Link link, List<TraceNode> branches) {
    Thing thing = link.thing();
    return new TraceNode(
        thing.code(),
        thing.kind(),
        thing.at(),
        thing.state(),
        link.from(),
        link.to(),
        link.magnets(),
        branches);
  }

  /// Follows links one way; each thing's branches are looked up once.
  private static final class Walk {
    private final Function<Thing, List<Link>> step;
    private final Map<Thing, List<TraceNode>> known = new HashMap<>();

    Walk(Function<Thing, List<Link>> step) {
      this.step = step;
    }

    List<TraceNode> branches(Thing thing) {
      @Nullable List<TraceNode> before = known.get(thing);
      if (before != null) {
        return before;
      }
      List<TraceNode> branches = new ArrayList<>();
      for (Link link : step.apply(thing)) {
        branches.add(node(link, branches(link.thing())));
      }
      known.put(thing, branches);
      return branches;
    }
  }
}
