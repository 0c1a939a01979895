package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;

/// A batch's rings and stock as a puzzle: pieces dealt to the slots, what is left on spare holders.
final class BatchHolders {
  private final BatchTask task;
  private final HarmonicForm[] forms;
  private final List<Source> sources;
  private final List<List<Source>> asTheyCome = new ArrayList<>();
  private final BatchPuzzle puzzle;

  /// @param forms of each ring
  /// @param buckets for each magnet type the rings that draw from the same pieces; none is short
  BatchHolders(BatchTask task, HarmonicForm[] forms, Map<String, List<BatchLots.Bucket>> buckets) {
    this.task = task;
    this.forms = forms;
    int[] first = new int[forms.length + 1];
    for (int ring = 0; ring < forms.length; ring++) {
      first[ring + 1] = first[ring] + forms[ring].slots;
    }
    Source[] inSlots = new Source[first[forms.length]];
    Source[] plain = new Source[inSlots.length];
    for (int ring = 0; ring < forms.length; ring++) {
      for (Kept kept : task.rings().get(ring).kept()) {
        inSlots[first[ring] + kept.slot() - 1] = Source.of(kept);
        plain[first[ring] + kept.slot() - 1] = Source.of(kept);
      }
    }
    List<Source> spares = new ArrayList<>();
    List<int[]> pools = new ArrayList<>();
    List<BatchDeal.Run> runs = new ArrayList<>();
    List<Integer> bucketOf = new ArrayList<>();
    buckets.forEach(
        (type, ofType) -> {
          for (BatchLots.Bucket bucket : ofType) {
            List<BatchDeal.Run> classes = classes(type, bucket.rings());
            boolean toAndFro = bucket.rings().stream().allMatch(ring -> classCount(ring) == 1);
            BatchDeal deal = new BatchDeal(bucket.pieces(), classes, toAndFro);
            IntStream slots =
                classes.stream()
                    .flatMapToInt(
                        run -> run.slots().stream().mapToInt(slot -> first[run.ring()] + slot));
            int spare = inSlots.length + spares.size();
            pools.add(
                IntStream.concat(slots, IntStream.range(spare, spare + deal.left().size()))
                    .sorted()
                    .toArray());
            spares.addAll(deal.left());
            deal.runs().forEach(run -> bucketOf.add(toAndFro ? -1 : pools.size()));
            runs.addAll(deal.runs());
            fillPlain(bucket, type, first, plain);
          }
        });
    matchAmplitudes(runs, bucketOf);
    for (BatchDeal.Run run : runs) {
      for (int i = 0; i < run.slots().size(); i++) {
        inSlots[first[run.ring()] + run.slots().get(i)] = run.pieces().get(i);
      }
    }
    for (int ring = 0; ring < forms.length; ring++) {
      asTheyCome.add(List.of(Arrays.copyOfRange(plain, first[ring], first[ring + 1])));
    }
    sources = new ArrayList<>(Arrays.asList(inSlots));
    sources.addAll(spares);
    int[] home = sources.stream().mapToInt(this::home).toArray();
    puzzle =
        new BatchPuzzle(forms, sources, home, pools.toArray(int[][]::new), targets(inSlots, first));
  }

  private void fillPlain(BatchLots.Bucket bucket, String type, int[] first, Source[] plain) {
    Iterator<Source> others = bucket.pieces().stream().filter(each -> home(each) < 0).iterator();
    for (int ring : bucket.rings()) {
      Iterator<Source> own = bucket.pieces().stream().filter(each -> home(each) == ring).iterator();
      for (int slot : task.rings().get(ring).emptySlots(type)) {
        plain[first[ring] + slot - 1] = own.hasNext() ? own.next() : others.next();
      }
    }
  }

  private int home(Source source) {
    String piece = source.piece();
    return piece == null || source.facing() != null ? -1 : task.wishedFor(piece);
  }

  /// Classes of slots of one type in the rings of a bucket: the first class of all rings, then the
  /// second the other way round, and so on, so that runs of rising strength nearly match.
  private List<BatchDeal.Run> classes(String type, List<Integer> rings) {
    List<BatchDeal.Run> classes = new ArrayList<>();
    int most = 0;
    List<List<BatchDeal.Run>> byRing = new ArrayList<>();
    for (int ring : rings) {
      byRing.add(ownClasses(type, ring));
      most = Math.max(most, byRing.getLast().size());
    }
    for (int number = 0; number < most; number++) {
      for (int i = 0; i < rings.size(); i++) {
        List<BatchDeal.Run> own = byRing.get(number % 2 == 0 ? i : rings.size() - 1 - i);
        if (number < own.size()) {
          classes.add(own.get(number));
        }
      }
    }
    return classes;
  }

  private List<BatchDeal.Run> ownClasses(String type, int ring) {
    List<Integer> empty = task.rings().get(ring).emptySlots(type);
    Puzzle alone = alone(ring, empty.stream().mapToInt(slot -> slot - 1).toArray());
    int segments = task.rings().get(ring).design().layout().segmentsPerPolePair();
    List<BatchDeal.Run> own = new ArrayList<>();
    for (int[] slots : new HarmlessClasses(alone, segments).slotsOf(0)) {
      double weight = 0;
      for (int slot : slots) {
        weight += Math.hypot(forms[ring].workingReal[slot], forms[ring].workingImaginary[slot]);
      }
      own.add(new BatchDeal.Run(ring, Arrays.stream(slots).boxed().toList(), weight, List.of()));
    }
    return own;
  }

  private int classCount(int ring) {
    return task.types().stream()
        .filter(type -> !task.rings().get(ring).emptySlots(type).isEmpty())
        .mapToInt(type -> ownClasses(type, ring).size())
        .sum();
  }

  /// Exchanges runs of equal length between rings while that brings the amplitudes closer.
  private void matchAmplitudes(List<BatchDeal.Run> runs, List<Integer> bucketOf) {
    double[] amplitude = new double[forms.length];
    Map<HarmonicForm, double[]> sums = new java.util.HashMap<>();
    for (BatchDeal.Run run : runs) {
      amplitude[run.ring()] += run.share();
    }
    for (int ring = 0; ring < forms.length; ring++) {
      double[] sum = sums.computeIfAbsent(forms[ring], form -> new double[2]);
      sum[0] += amplitude[ring];
      sum[1]++;
    }
    double[] off = new double[forms.length];
    for (int ring = 0; ring < forms.length; ring++) {
      double[] sum = sums.getOrDefault(forms[ring], new double[] {1, 1});
      off[ring] = amplitude[ring] - sum[0] / sum[1];
    }
    boolean better = true;
    for (int round = 0; round < 50 && better; round++) {
      better = false;
      for (int a = 0; a < runs.size(); a++) {
        for (int b = a + 1; b < runs.size(); b++) {
          better |= exchanged(runs, bucketOf, off, a, b);
        }
      }
    }
  }

  private static boolean exchanged(
      List<BatchDeal.Run> runs, List<Integer> bucketOf, double[] off, int a, int b) {
    BatchDeal.Run one = runs.get(a);
    BatchDeal.Run two = runs.get(b);
    if (bucketOf.get(a) < 0
        || !bucketOf.get(a).equals(bucketOf.get(b))
        || one.slots().size() != two.slots().size()) {
      return false;
    }
    BatchDeal.Run oneWith = new BatchDeal.Run(one.ring(), one.slots(), one.weight(), two.pieces());
    BatchDeal.Run twoWith = new BatchDeal.Run(two.ring(), two.slots(), two.weight(), one.pieces());
    double changeOne = oneWith.share() - one.share();
    double changeTwo = twoWith.share() - two.share();
    double before;
    double after;
    if (one.ring() == two.ring()) {
      before = Math.abs(off[one.ring()]);
      after = Math.abs(off[one.ring()] + changeOne + changeTwo);
    } else {
      before = Math.hypot(off[one.ring()], off[two.ring()]);
      after = Math.hypot(off[one.ring()] + changeOne, off[two.ring()] + changeTwo);
    }
    if (after >= before * (1 - 1e-9)) {
      return false;
    }
    off[one.ring()] += changeOne;
    off[two.ring()] += changeTwo;
    runs.set(a, oneWith);
    runs.set(b, twoWith);
    return true;
  }

  /// For each ring the mean |w·s| of all rings of its layout as dealt.
  private double[] targets(Source[] inSlots, int[] first) {
    double[] amplitude = new double[forms.length];
    for (int ring = 0; ring < forms.length; ring++) {
      double[] strength =
          Arrays.stream(inSlots, first[ring], first[ring + 1])
              .mapToDouble(Source::remanence)
              .toArray();
      amplitude[ring] = forms[ring].workingAmplitude(strength) / 2;
    }
    double[] target = new double[forms.length];
    for (int ring = 0; ring < forms.length; ring++) {
      String layout = task.rings().get(ring).design().layout().name();
      target[ring] =
          IntStream.range(0, forms.length)
              .filter(other -> task.rings().get(other).design().layout().name().equals(layout))
              .mapToDouble(other -> amplitude[other])
              .average()
              .orElseThrow();
    }
    return target;
  }

  BatchPuzzle puzzle() {
    return puzzle;
  }

  /// The order in which the pieces are dealt; pieces that a ring must have change places with the
  /// pieces most like them there.
  int[] dealt() {
    int[] order = IntStream.range(0, sources.size()).toArray();
    for (int[] pool : puzzle.pools) {
      for (int holder : pool) {
        while (!puzzle.fits(order[holder], puzzle.ringOf[holder])) {
          int piece = order[holder];
          int slot = mostAlikeAtHome(piece, pool, order);
          order[holder] = order[slot];
          order[slot] = piece;
        }
      }
    }
    return order;
  }

  /// The slot of the ring that must have a piece, with the piece most like it that needn't be
  /// there.
  private int mostAlikeAtHome(int piece, int[] pool, int[] order) {
    int ring = puzzle.home[piece];
    double wanted = puzzle.strength[piece];
    return Arrays.stream(pool)
        .filter(each -> puzzle.ringOf[each] == ring && puzzle.home[order[each]] != ring)
        .boxed()
        .min(Comparator.comparingDouble(each -> Math.abs(puzzle.strength[order[each]] - wanted)))
        .orElseThrow();
  }

  List<Source> inSlots(int ring, int[] order) {
    return IntStream.range(puzzle.first[ring], puzzle.first[ring + 1])
        .mapToObj(holder -> sources.get(order[holder]))
        .toList();
  }

  /// The ring with the pieces of its bucket in the order of their numbers.
  List<Source> asTheyCome(int ring) {
    return asTheyCome.get(ring);
  }

  /// A ring by itself with given pieces.
  Puzzle alone(int ring, List<Source> pieces) {
    BatchTask.Ring each = task.rings().get(ring);
    int[][] pools =
        task.types().stream()
            .map(each::emptySlots)
            .filter(slots -> !slots.isEmpty())
            .map(slots -> slots.stream().mapToInt(slot -> slot - 1).toArray())
            .toArray(int[][]::new);
    return new Puzzle(
        forms[ring],
        pieces.stream().mapToDouble(Source::remanence).toArray(),
        pieces.stream().mapToDouble(Source::variance).toArray(),
        pools,
        1,
        1);
  }

  private Puzzle alone(int ring, int[] slots) {
    int n = forms[ring].slots;
    return new Puzzle(forms[ring], new double[n], new double[n], new int[][] {slots}, 1, 1);
  }
}
