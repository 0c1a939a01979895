package lodebook.db.refusal;

import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// Something to say to a person, not yet in words: a key of the bundle and its arguments.
///
/// @param key key in `lodebook.db.messages`
/// @param arguments what fills the sentence's places, already as text
public record Notice(String key, List<String> arguments) {
  public Notice {
    arguments = List.copyOf(arguments);
  }

  /// A notice whose arguments are turned to text by `String.valueOf`.
  public static Notice of(String key, @Nullable Object... arguments) {
    return new Notice(key, Arrays.stream(arguments).map(String::valueOf).toList());
  }
}
