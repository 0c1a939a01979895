package lodebook.db.keep;

import static org.jooq.impl.DSL.exists;
import static org.jooq.impl.DSL.not;
import static org.jooq.impl.DSL.selectOne;

import java.util.ArrayList;
import java.util.List;
import lodebook.db.refusal.Notice;
import lodebook.db.tables.DefaultSchema;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Field;
import org.jooq.ForeignKey;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.TableField;
import org.jooq.impl.DSL;

/// Looks whether every foreign key points to something, in case the tables were changed from
/// outside with the rules switched off.
final class ForeignKeys {
  private ForeignKeys() {}

  /// One notice for each foreign key with rows that point to nothing.
  static List<Notice> broken(DSLContext sql) {
    List<Notice> broken = new ArrayList<>();
    for (Table<?> table : DefaultSchema.DEFAULT_SCHEMA.getTables()) {
      for (ForeignKey<?, ?> key : table.getReferences()) {
        int rows = strays(sql, table, key);
        if (rows > 0) {
          broken.add(Notice.of("verify.foreign-key", table.getName(), key.getName(), rows));
        }
      }
    }
    return broken;
  }

  private static int strays(DSLContext sql, Table<?> table, ForeignKey<?, ?> key) {
    Table<? extends Record> parent = key.getKey().getTable().as("parent");
    Condition set = DSL.noCondition();
    Condition meets = DSL.noCondition();
    for (int i = 0; i < key.getFields().size(); i++) {
      TableField<?, ?> child = key.getFields().get(i);
      set = set.and(child.isNotNull());
      meets = meets.and(equal(parent.field(key.getKeyFields().get(i).getName()), child));
    }
    return sql.fetchCount(table, set.and(not(exists(selectOne().from(parent).where(meets)))));
  }

  @SuppressWarnings("unchecked")
  private static Condition equal(
      @org.jspecify.annotations.Nullable Field<?> parent, Field<?> child) {
    if (parent == null) {
      throw new IllegalStateException("a foreign key without its parent column");
    }
    return ((Field<Object>) parent).eq((Field<Object>) child);
  }
}
