package lodebook.db.stock;

/// The order of cells as people count them: runs of digits as numbers, so A2 before A10.
final class CellOrder {
  private CellOrder() {}

  static int compare(String left, String right) {
    int i = 0;
    int j = 0;
    while (i < left.length() && j < right.length()) {
      int endLeft = end(left, i);
      int endRight = end(right, j);
      String a = left.substring(i, endLeft);
      String b = right.substring(j, endRight);
      int order = compareRuns(a, b);
      if (order != 0) {
        return order;
      }
      i = endLeft;
      j = endRight;
    }
    int rest = Integer.compare(left.length() - i, right.length() - j);
    return rest != 0 ? rest : left.compareTo(right);
  }

  private static int end(String text, int from) {
    int end = from + 1;
    boolean digits = Character.isDigit(text.charAt(from));
    while (digits && end < text.length() && Character.isDigit(text.charAt(end))) {
      end++;
    }
    return end;
  }

  private static int compareRuns(String a, String b) {
    if (Character.isDigit(a.charAt(0)) && Character.isDigit(b.charAt(0))) {
      return new java.math.BigInteger(a).compareTo(new java.math.BigInteger(b));
    }
    return a.compareToIgnoreCase(b);
  }
}
