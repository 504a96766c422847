package distanceladder.validation;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * Data and certified values of the National Institute of Standards and Technology, Statistical Reference Datasets,
 * linear least-squares regression (public domain). Each data line is y, then the predictors.
 */
record NistDataset(String name, double[][] design, double[] y, double[] coefficients, double[] sigmas, double rsd) {

    /** Norris (interlaboratory study of ozone monitors), file Norris.dat: y = b0 + b1 x. */
    static NistDataset norris() {
        String data = """
                0.1 0.2; 338.8 337.4; 118.1 118.2; 888 884.6
                9.2 10.1; 228.1 226.5; 668.5 666.3; 998.5 996.3
                449.1 448.6; 778.9 777; 559.2 558.2; 0.3 0.4
                0.1 0.6; 778.1 775.5; 668.8 666.9; 339.3 338
                448.9 447.5; 10.8 11.6; 557.7 556; 228.3 228.1
                998 995.8; 888.8 887.6; 119.6 120.2; 0.3 0.3
                0.6 0.3; 557.6 556.8; 339.3 339.1; 888 887.2
                998.5 999; 778.9 779; 10.2 11.1; 117.6 118.3
                228.9 229.2; 668.4 669.1; 449.2 448.9; 0.2 0.5
                """;
        return new NistDataset(
                "Norris",
                functions(lines(data), x -> 1, x -> x),
                first(lines(data)),
                new double[] {-0.262323073774029, 1.00211681802045},
                new double[] {0.232818234301152, 0.429796848199937e-03},
                0.884796396144373);
    }

    /** Pontius (calibration of load cells), file Pontius.dat: y = b0 + b1 x + b2 x^2. */
    static NistDataset pontius() {
        String data = """
                0.11019 150000; 0.21956 300000; 0.32949 450000; 0.43899 600000
                0.54803 750000; 0.65694 900000; 0.76562 1050000; 0.87487 1200000
                0.98292 1350000; 1.09146 1500000; 1.20001 1650000; 1.30822 1800000
                1.41599 1950000; 1.52399 2100000; 1.63194 2250000; 1.73947 2400000
                1.84646 2550000; 1.95392 2700000; 2.06128 2850000; 2.16844 3000000
                0.11052 150000; 0.22018 300000; 0.32939 450000; 0.43886 600000
                0.54798 750000; 0.65739 900000; 0.76596 1050000; 0.87474 1200000
                0.983 1350000; 1.0915 1500000; 1.20004 1650000; 1.30818 1800000
                1.41613 1950000; 1.52408 2100000; 1.63159 2250000; 1.73965 2400000
                1.84696 2550000; 1.95445 2700000; 2.06177 2850000; 2.16829 3000000
                """;
        return new NistDataset(
                "Pontius",
                functions(lines(data), x -> 1, x -> x, x -> x * x),
                first(lines(data)),
                new double[] {0.673565789473684e-03, 0.732059160401003e-06, -0.316081871345029e-14},
                new double[] {0.107938612033077e-03, 0.157817399981659e-09, 0.486652849992036e-16},
                0.205177424076185E-03);
    }

    /** NoInt1 (Eberhardt), file NoInt1.dat: y = b1 x. */
    static NistDataset noint1() {
        String data = """
                130 60; 131 61; 132 62; 133 63
                134 64; 135 65; 136 66; 137 67
                138 68; 139 69; 140 70
                """;
        return new NistDataset(
                "NoInt1",
                functions(lines(data), x -> x),
                first(lines(data)),
                new double[] {2.07438016528926},
                new double[] {0.165289256198347e-01},
                3.56753034006338);
    }

    /** Longley (1967, JASA 62, 819), file Longley.dat: y = b0 + b1 x1 + ... + b6 x6. */
    static NistDataset longley() {
        String data = """
                60323 83 234289 2356 1590 107608 1947
                61122 88.5 259426 2325 1456 108632 1948
                60171 88.2 258054 3682 1616 109773 1949
                61187 89.5 284599 3351 1650 110929 1950
                63221 96.2 328975 2099 3099 112075 1951
                63639 98.1 346999 1932 3594 113270 1952
                64989 99 365385 1870 3547 115094 1953
                63761 100 363112 3578 3350 116219 1954
                66019 101.2 397469 2904 3048 117388 1955
                67857 104.6 419180 2822 2857 118734 1956
                68169 108.4 442769 2936 2798 120445 1957
                66513 110.8 444546 4681 2637 121950 1958
                68655 112.6 482704 3813 2552 123366 1959
                69564 114.2 502601 3931 2514 125368 1960
                69331 115.7 518173 4806 2572 127852 1961
                70551 116.9 554894 4007 2827 130081 1962
                """;
        return new NistDataset(
                "Longley",
                withIntercept(lines(data)),
                first(lines(data)),
                new double[] {
                    -3482258.63459582,
                    15.0618722713733,
                    -0.358191792925910e-01,
                    -2.02022980381683,
                    -1.03322686717359,
                    -0.511041056535807e-01,
                    1829.15146461355
                },
                new double[] {
                    890420.383607373,
                    84.9149257747669,
                    0.334910077722432e-01,
                    0.488399681651699,
                    0.214274163161675,
                    0.226073200069370,
                    455.478499142212
                },
                304.854073561965);
    }

    private static double[][] lines(String data) {
        return Arrays.stream(data.strip().split("\\s*[;\n]\\s*", -1))
                .map(line -> Arrays.stream(line.strip().split(" ", -1))
                        .mapToDouble(Double::parseDouble)
                        .toArray())
                .toArray(double[][]::new);
    }

    private static double[] first(double[][] lines) {
        return Arrays.stream(lines).mapToDouble(line -> line[0]).toArray();
    }

    private static double[][] functions(double[][] lines, DoubleUnaryOperator... columns) {
        return Arrays.stream(lines)
                .map(line -> Arrays.stream(columns)
                        .mapToDouble(column -> column.applyAsDouble(line[1]))
                        .toArray())
                .toArray(double[][]::new);
    }

    private static double[][] withIntercept(double[][] lines) {
        return Arrays.stream(lines)
                .map(line -> {
                    double[] row = line.clone();
                    row[0] = 1;
                    return row;
                })
                .toArray(double[][]::new);
    }
}
