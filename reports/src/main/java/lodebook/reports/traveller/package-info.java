/// The traveller of a rotor: ring, steps, readings to take, notices for handling magnets.
@NullMarked
package lodebook.reports.traveller;

import org.jspecify.annotations.NullMarked;
