"""Times numpy.linalg.solve on a matrix from a file, one go for each line on standard input; answers milliseconds, one a line."""

import sys
import time

import numpy as np

path, n, columns = sys.argv[1], int(sys.argv[2]), int(sys.argv[3])
numbers = np.fromfile(path, dtype="<f8")
a = numbers[: n * n].reshape(n, n)
b = numbers[n * n :].reshape(n, columns)
print("ready", flush=True)
for line in sys.stdin:
    goes = int(line)
    start = time.perf_counter()
    for _ in range(goes):
        np.linalg.solve(a, b)
    print((time.perf_counter() - start) * 1000 / goes, flush=True)
