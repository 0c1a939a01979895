/// Gaussmeter surveys of rotors: readings as they were stated, the ring as it stood when each was
/// recorded, and what checks of them said.
@NullMarked
package lodebook.db.surveys;

import org.jspecify.annotations.NullMarked;
