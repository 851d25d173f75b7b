package gapwright.physics.network;

import java.util.Arrays;

/**
 * A fill-reducing elimination order by approximate minimum degree on the quotient graph: an eliminated unknown becomes
 * an element whose members are its neighbours then; elements swallow each other. Method: Amestoy, Davis and Duff 1996
 * (from memory), without supervariables, which networks of mostly four branches a joint do not repay.
 */
final class MinimumDegree {

	private final int n;
	private final int[][] variables;
	private final int[] variableCount;
	private final int[][] elements;
	private final int[] elementCount;
	/** Members of each live element; null for an unknown not yet eliminated or an element swallowed. */
	private final int[][] members;
	private final int[] degree;
	private final int[] mark;
	private final int[] outside;
	private final int[] outsideStamp;
	private int stamp;
	private final int[] head;
	private final int[] next;
	private final int[] previous;

	private MinimumDegree(int n, int[] first, int[] second) {
		this.n = n;
		variables = new int[n][4];
		variableCount = new int[n];
		elements = new int[n][4];
		elementCount = new int[n];
		members = new int[n][];
		degree = new int[n];
		mark = new int[n];
		outside = new int[n];
		outsideStamp = new int[n];
		head = new int[n + 1];
		next = new int[n];
		previous = new int[n];
		for (int k = 0; k < first.length; k++) {
			if (first[k] >= 0 && second[k] >= 0) {
				addVariable(first[k], second[k]);
				addVariable(second[k], first[k]);
			}
		}
		for (int i = 0; i < n; i++) {
			dropRepeated(i);
		}
	}

	/**
	 * @param n             number of unknowns
	 * @param first, second unknowns at the ends of each branch, negative where there is none
	 * @return unknowns in the order in which to eliminate them
	 */
	static int[] order(int n, int[] first, int[] second) {
		return new MinimumDegree(n, first, second).order();
	}

	private int[] order() {
		Arrays.fill(head, -1);
		for (int i = n - 1; i >= 0; i--) {
			degree[i] = variableCount[i];
			link(i);
		}
		int[] order = new int[n];
		int least = 0;
		for (int k = 0; k < n; k++) {
			while (head[least] < 0) {
				least++;
			}
			int pivot = head[least];
			unlink(pivot);
			order[k] = pivot;
			least = Math.max(0, eliminate(pivot, n - k - 1));
		}
		return order;
	}

	/** @return a lower bound of the least degree afterwards */
	private int eliminate(int pivot, int remaining) {
		int[] around = neighbourhood(pivot);
		members[pivot] = around;
		countOutside(around);
		int least = n;
		for (int i : around) {
			unlink(i);
			int approximate = around.length - 1;
			int kept = 0;
			int[] own = elements[i];
			for (int e = 0; e < elementCount[i]; e++) {
				int element = own[e];
				if (members[element] == null) {
					continue;
				}
				if (outside[element] == 0) {
					members[element] = null;
				} else {
					own[kept++] = element;
					approximate += outside[element];
				}
			}
			elementCount[i] = kept;
			addElement(i, pivot);
			kept = 0;
			int[] near = variables[i];
			for (int v = 0; v < variableCount[i]; v++) {
				if (near[v] != pivot && mark[near[v]] != stamp) {
					near[kept++] = near[v];
				}
			}
			variableCount[i] = kept;
			approximate += kept;
			degree[i] = Math.min(Math.min(approximate, degree[i] + around.length - 1), Math.max(0, remaining - 1));
			link(i);
			least = Math.min(least, degree[i]);
		}
		variables[pivot] = null;
		elements[pivot] = null;
		return Math.min(least, Math.max(0, degree[pivot] - 1));
	}

	/** Unknowns next to the pivot, directly or through elements, each marked once; those elements are swallowed. */
	private int[] neighbourhood(int pivot) {
		stamp++;
		mark[pivot] = stamp;
		int count = 0;
		int[] found = new int[Math.max(4, degree[pivot])];
		for (int v = 0; v < variableCount[pivot]; v++) {
			int i = variables[pivot][v];
			if (mark[i] != stamp) {
				mark[i] = stamp;
				found = put(found, count++, i);
			}
		}
		for (int e = 0; e < elementCount[pivot]; e++) {
			int element = elements[pivot][e];
			if (members[element] == null) {
				continue;
			}
			for (int i : members[element]) {
				if (mark[i] != stamp) {
					mark[i] = stamp;
					found = put(found, count++, i);
				}
			}
			members[element] = null;
		}
		return Arrays.copyOf(found, count);
	}

	/** For every element near the pivot's neighbourhood, how many of its members lie outside that. */
	private void countOutside(int[] around) {
		for (int i : around) {
			for (int e = 0; e < elementCount[i]; e++) {
				int element = elements[i][e];
				if (members[element] == null) {
					continue;
				}
				if (outsideStamp[element] != stamp) {
					outsideStamp[element] = stamp;
					outside[element] = members[element].length;
				}
				outside[element]--;
			}
		}
	}

	private void link(int i) {
		int d = degree[i];
		next[i] = head[d];
		previous[i] = -1;
		if (head[d] >= 0) {
			previous[head[d]] = i;
		}
		head[d] = i;
	}

	private void unlink(int i) {
		if (previous[i] >= 0) {
			next[previous[i]] = next[i];
		} else {
			head[degree[i]] = next[i];
		}
		if (next[i] >= 0) {
			previous[next[i]] = previous[i];
		}
	}

	private void addVariable(int i, int other) {
		variables[i] = put(variables[i], variableCount[i]++, other);
	}

	private void addElement(int i, int element) {
		elements[i] = put(elements[i], elementCount[i]++, element);
	}

	private void dropRepeated(int i) {
		stamp++;
		int kept = 0;
		for (int v = 0; v < variableCount[i]; v++) {
			int other = variables[i][v];
			if (mark[other] != stamp) {
				mark[other] = stamp;
				variables[i][kept++] = other;
			}
		}
		variableCount[i] = kept;
	}

	private static int[] put(int[] array, int at, int value) {
		int[] room = at < array.length ? array : Arrays.copyOf(array, 2 * array.length);
		room[at] = value;
		return room;
	}
}
