package distanceladder.covariance;

import java.util.ArrayList;
import java.util.List;

/** Indices joined into groups (union by smallest member, with path halving). */
final class Groups {
    private final int[] parent;

    Groups(int size) {
        parent = new int[size];
        for (int i = 0; i < size; i++) {
            parent[i] = i;
        }
    }

    private int root(int i) {
        int at = i;
        while (parent[at] != at) {
            parent[at] = parent[parent[at]];
            at = parent[at];
        }
        return at;
    }

    void join(int i, int j) {
        int a = root(i);
        int b = root(j);
        parent[Math.max(a, b)] = Math.min(a, b);
    }

    /** The groups of two and more, each ascending, in the order of their first members. */
    List<int[]> larger() {
        int[] counts = new int[parent.length];
        for (int i = 0; i < parent.length; i++) {
            counts[root(i)]++;
        }
        int[][] members = new int[parent.length][];
        List<int[]> groups = new ArrayList<>();
        int[] filled = new int[parent.length];
        for (int i = 0; i < parent.length; i++) {
            int root = root(i);
            if (counts[root] > 1) {
                if (root == i) {
                    members[i] = new int[counts[i]];
                    groups.add(members[i]);
                }
                members[root][filled[root]++] = i;
            }
        }
        return groups;
    }
}
