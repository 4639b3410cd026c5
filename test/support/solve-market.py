"""Solves a system in Matrix Market form by SciPy's direct sparse LU and prints the answer, one number a line."""

import sys

from scipy.io import mmread
from scipy.sparse.linalg import splu

matrix = mmread(sys.argv[1]).tocsc()
right_side = mmread(sys.argv[2]).ravel()
factor = splu(matrix)
answer = factor.solve(right_side)
# One step of iterative refinement, so that rounding in the factor is not seen.
answer = answer + factor.solve(right_side - matrix @ answer)
print("\n".join(repr(float(value)) for value in answer))
