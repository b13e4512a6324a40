package sill.stdlib;

import java.util.ArrayList;
import java.util.List;

/** Solves a network of resistors by its node equations; node 0 is 0 V. The reference for the closed forms. */
final class NodalSolver {
    private final double[][] matrix;
    private final double[] currents;
    private final List<double[]> sources = new ArrayList<>();
    private final int nodes;

    NodalSolver(int nodes, int sourceCount) {
        this.nodes = nodes;
        matrix = new double[nodes + sourceCount][nodes + sourceCount];
        currents = new double[nodes + sourceCount];
    }

    NodalSolver resistor(int a, int b, double r) {
        for (int[] pair : new int[][] {{a, b}, {b, a}}) {
            if (pair[0] > 0) {
                matrix[pair[0] - 1][pair[0] - 1] += 1 / r;
                if (pair[1] > 0) {
                    matrix[pair[0] - 1][pair[1] - 1] -= 1 / r;
                }
            }
        }
        return this;
    }

    NodalSolver source(int node, double voltage) {
        int row = nodes + sources.size();
        sources.add(new double[] {node, voltage});
        matrix[node - 1][row] = 1;
        matrix[row][node - 1] = 1;
        currents[row] = voltage;
        return this;
    }

    double voltage(int node) {
        return solve()[node - 1];
    }

    /** Gaussian elimination with the largest pivot. */
    private double[] solve() {
        int n = currents.length;
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int row = column; row < n; row++) {
                if (Math.abs(matrix[row][column]) > Math.abs(matrix[pivot][column])) {
                    pivot = row;
                }
            }
            swap(column, pivot);
            for (int row = 0; row < n; row++) {
                if (row != column) {
                    double factor = matrix[row][column] / matrix[column][column];
                    for (int k = column; k < n; k++) {
                        matrix[row][k] -= factor * matrix[column][k];
                    }
                    currents[row] -= factor * currents[column];
                }
            }
        }
        double[] voltages = new double[n];
        for (int i = 0; i < n; i++) {
            voltages[i] = currents[i] / matrix[i][i];
        }
        return voltages;
    }

    private void swap(int a, int b) {
        double[] row = matrix[a];
        matrix[a] = matrix[b];
        matrix[b] = row;
        double current = currents[a];
        currents[a] = currents[b];
        currents[b] = current;
    }
}
