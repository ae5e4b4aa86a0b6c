"""Writes numpy's transform of repeatable values for each length given, as little-endian float64: values, then spectrum."""

import sys

import numpy as np

for length in map(int, sys.argv[1:]):
    values = np.random.default_rng(length).standard_normal(length)
    sys.stdout.buffer.write(values.astype("<f8").tobytes())
    sys.stdout.buffer.write(np.fft.rfft(values).astype("<c16").tobytes())
