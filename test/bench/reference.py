"""General-purpose solver beside ours, one thread: conjugate gradients with hypre's BoomerAMG through PETSc where Debian's
python3-petsc4py is installed, else SciPy's conjugate gradients with an incomplete LU factorisation (python3-scipy).

Reads lines "name tolerance" on standard input; the system stands in <folder>/name.{ptr,col,val,b} (CSR, native numbers). Answers
each with one line of JSON: seconds with set-up, iterations, relative residual; the solution goes to <folder>/name.x.
"""
import glob
import json
import sys
import time

import numpy as np
import scipy.sparse as sparse

sys.path += glob.glob("/usr/lib/petscdir/petsc*/x86_64-linux-gnu-real/lib/python3/dist-packages")
try:
    import petsc4py

    petsc4py.init(["reference"])
    from petsc4py import PETSc
except ImportError:
    PETSc = None
    from scipy.sparse.linalg import LinearOperator, cg, spilu


def boomer(matrix, b, tolerance):
    n = len(b)
    operator = PETSc.Mat().createAIJ((n, n), csr=(matrix.indptr, matrix.indices, matrix.data), comm=PETSc.COMM_SELF)
    right = PETSc.Vec().createWithArray(b, comm=PETSc.COMM_SELF)
    x = right.duplicate()
    began = time.perf_counter()
    solver = PETSc.KSP().create(PETSc.COMM_SELF)
    solver.setOperators(operator)
    solver.setType("cg")
    solver.setNormType(PETSc.KSP.NormType.UNPRECONDITIONED)
    solver.getPC().setType("hypre")
    solver.getPC().setHYPREType("boomeramg")
    solver.setTolerances(rtol=tolerance, atol=0, max_it=1000)
    solver.setUp()
    solver.solve(right, x)
    seconds = time.perf_counter() - began
    return seconds, solver.getIterationNumber(), x.getArray().copy()


def scipy_cg(matrix, b, tolerance):
    count = [0]
    began = time.perf_counter()
    factors = spilu(matrix.tocsc(), drop_tol=1e-3, fill_factor=10)
    keep = LinearOperator(matrix.shape, factors.solve)

    def step(_):
        count[0] += 1

    try:
        x, _ = cg(matrix, b, rtol=tolerance, atol=0, maxiter=5000, M=keep, callback=step)
    except TypeError:
        x, _ = cg(matrix, b, tol=tolerance, atol=0, maxiter=5000, M=keep, callback=step)
    return time.perf_counter() - began, count[0], x


folder = sys.argv[1]
solve = boomer if PETSc else scipy_cg
print(json.dumps({"name": "PETSc CG with hypre BoomerAMG" if PETSc else "SciPy CG with incomplete LU"}), flush=True)
for line in sys.stdin:
    name, tolerance = line.split()
    read = lambda ending, kind: np.fromfile(f"{folder}/{name}.{ending}", kind)
    matrix = sparse.csr_matrix((read("val", np.float64), read("col", np.int32), read("ptr", np.int32)))
    matrix.sum_duplicates()
    b = read("b", np.float64)
    seconds, iterations, x = solve(matrix, b, float(tolerance))
    x.tofile(f"{folder}/{name}.x")
    residual = float(np.linalg.norm(b - matrix @ x) / np.linalg.norm(b))
    print(json.dumps({"seconds": seconds, "iterations": iterations, "residual": residual}), flush=True)
