package loadmark.solve;

import java.util.Arrays;

/**
 * Where the branches of an elimination are held, and when those given are written. Immutable.
 *
 * <p>Where nothing is asked of an eliminated branch any more, its room is used again, so that even
 * large networks stay near the processor.
 */
final class Storage {
  /** For each branch, the room that it has. */
  final int[] room;

  /** How many rooms there are. */
  final int rooms;

  /** For each star, and then for what is left, the given branches that are first needed there. */
  final int[][] needed;

  private Storage(int[] room, int rooms, int[][] needed) {
    this.room = room;
    this.rooms = rooms;
    this.needed = needed;
  }

  /**
   * Works out the storage.
   *
   * @param keeps whether all branches stay to the end
   */
  static Storage of(Elimination elimination, boolean keeps) {
    return new Builder(elimination, keeps).build();
  }

  private static final class Builder {
    private final Elimination elimination;
    private final boolean keeps;
    private final int[] room;
    private final int[] free;
    private int freed;
    private int rooms;
    private int[] list = new int[8];
    private int listed;

    Builder(Elimination elimination, boolean keeps) {
      this.elimination = elimination;
      this.keeps = keeps;
      room = new int[elimination.branches()];
      Arrays.fill(room, -1);
      free = new int[elimination.branches()];
    }

    Storage build() {
      Elimination.Star[] stars = elimination.stars();
      int[][] needed = new int[stars.length + 1][];
      for (int k = 0; k < stars.length; k++) {
        for (int member : stars[k].members) {
          need(member);
        }
        for (int target : stars[k].targets) {
          need(target >= 0 ? target : ~target);
        }
        needed[k] = take();
        if (!keeps) {
          for (int member : stars[k].members) {
            free[freed++] = room[member];
          }
        }
      }
      for (int i = 0; i < elimination.given(); i++) {
        need(i);
      }
      needed[stars.length] = take();
      return new Storage(room, rooms, needed);
    }

    private void need(int branch) {
      if (room[branch] >= 0) {
        return;
      }
      room[branch] = freed > 0 ? free[--freed] : rooms++;
      if (branch < elimination.given()) {
        list = listed == list.length ? Arrays.copyOf(list, 2 * listed) : list;
        list[listed++] = branch;
      }
    }

    private int[] take() {
      int[] taken = Arrays.copyOf(list, listed);
      listed = 0;
      return taken;
    }
  }
}
