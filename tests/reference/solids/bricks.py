"""Linear solids of 20-node bricks on a structured grid, 8 integration points. For the scripts of the reference cases.

Needs Python 3 with numpy and scipy.
"""
import numpy as np
from scipy.sparse import coo_matrix
from scipy.sparse.linalg import spsolve

CORNERS = np.array([(0, 0, 0), (2, 0, 0), (2, 2, 0), (0, 2, 0), (0, 0, 2), (2, 0, 2), (2, 2, 2), (0, 2, 2),
                    (1, 0, 0), (2, 1, 0), (1, 2, 0), (0, 1, 0), (1, 0, 2), (2, 1, 2), (1, 2, 2), (0, 1, 2),
                    (0, 0, 1), (2, 0, 1), (2, 2, 1), (0, 2, 1)])
NATURAL = CORNERS - 1.0


def stiffness(modulus, poisson):
    """6 x 6 of an isotropic solid."""
    lame, shear = modulus * poisson / ((1 + poisson) * (1 - 2 * poisson)), modulus / (2 * (1 + poisson))
    D = np.diag([2 * shear + lame] * 3 + [shear] * 3)
    D[:3, :3] += lame * (1 - np.eye(3))
    return D


def derivatives(point):
    """Of the 20 shape functions in natural coordinates, 20 x 3."""
    def shapes(p):
        a = NATURAL * p
        corner = np.all(NATURAL != 0, axis=1)
        value = np.prod(1 + a, axis=1) / 8 * (a.sum(1) - 2)
        for axis in range(3):
            middle = ~corner & (NATURAL[:, axis] == 0)
            others = [k for k in range(3) if k != axis]
            value[middle] = (1 - p[axis] ** 2) * np.prod(1 + a[middle][:, others], axis=1) / 4
        return value
    step = 1e-5
    return np.stack([(shapes(point + step * np.eye(3)[k]) - shapes(point - step * np.eye(3)[k])) / (2 * step)
                     for k in range(3)], axis=1)


def strain_matrix(point, size):
    """6 x 60, for a brick of edge lengths `size`; shear as gamma, order xx yy zz yz xz xy."""
    d = derivatives(np.asarray(point)) * 2 / size
    B = np.zeros((6, 60))
    for axis in range(3):
        B[axis, axis::3] = d[:, axis]
    B[3, 1::3], B[3, 2::3] = d[:, 2], d[:, 1]
    B[4, 0::3], B[4, 2::3] = d[:, 2], d[:, 0]
    B[5, 0::3], B[5, 1::3] = d[:, 1], d[:, 0]
    return B


def spaced(marks, counts):
    """Grid lines through the marks with so many even cells between each."""
    return np.concatenate([[marks[0]]] + [np.linspace(a, b, n + 1)[1:] for a, b, n in zip(marks, marks[1:], counts)])


class Solid:
    """The cells of a grid whose centre lies inside; D its 6 x 6 stiffness."""

    def __init__(self, xs, ys, zs, inside, D):
        middles = lambda a: np.sort(np.concatenate([a, (a[1:] + a[:-1]) / 2]))
        centre = lambda a: (a[1:] + a[:-1]) / 2
        X, Y, Z = middles(xs), middles(ys), middles(zs)
        shape = (len(xs) - 1, len(ys) - 1, len(zs) - 1)
        filled = inside(centre(xs)[:, None, None], centre(ys)[None, :, None], centre(zs)[None, None, :])
        cells = np.argwhere(np.broadcast_to(filled, shape))
        number = ((2 * cells[:, None, 0] + CORNERS[:, 0]) * len(Y) + 2 * cells[:, None, 1] + CORNERS[:, 1]) * len(Z)
        used, bricks = np.unique(number + 2 * cells[:, None, 2] + CORNERS[:, 2], return_inverse=True)
        self.bricks = bricks.reshape(-1, 20)
        self.points = np.stack([X[used // (len(Y) * len(Z))], Y[(used // len(Z)) % len(Y)], Z[used % len(Z)]], 1)
        self.sizes = self.points[self.bricks[:, 6]] - self.points[self.bricks[:, 0]]
        self.dofs = (3 * self.bricks[:, :, None] + np.arange(3)).reshape(-1, 60)
        self.K = self.assembled(D)
        self.u, self.held = np.zeros(3 * len(self.points)), np.zeros(3 * len(self.points), bool)

    def assembled(self, D):
        gauss = np.array(np.meshgrid(*[[-1, 1]] * 3)).reshape(3, -1).T / 3 ** 0.5
        made = {}
        for size in np.unique(self.sizes.round(9), axis=0):
            parts = (strain_matrix(point, size) for point in gauss)
            made[tuple(size)] = sum(B.T @ D @ B for B in parts) * np.prod(size) / 8
        stiff = np.stack([made[tuple(size)] for size in self.sizes.round(9)])
        rows, columns = np.repeat(self.dofs, 60, 1).ravel(), np.tile(self.dofs, (1, 60)).ravel()
        n = 3 * len(self.points)
        return coo_matrix((stiff.ravel(), (rows, columns)), (n, n)).tocsr()

    def on(self, axis, value):
        """Nodes of a plane."""
        return np.flatnonzero(np.abs(self.points[:, axis] - value) < 1e-9)

    def hold(self, nodes, direction, value=0.0):
        self.held[3 * nodes + direction] = True
        self.u[3 * nodes + direction] = value

    def solve(self):
        free = ~self.held
        self.u[free] = spsolve(self.K[free][:, free], -(self.K[free][:, self.held] @ self.u[self.held]))

    def reaction(self, nodes, direction):
        return (self.K @ self.u)[3 * nodes + direction]

    def strain(self, where):
        """Strain (6) at a point, mean of the bricks that meet there."""
        low = self.points[self.bricks[:, 0]]
        inside = np.all((where >= low - 1e-9) & (where <= low + self.sizes + 1e-9), axis=1)
        out = []
        for k in np.flatnonzero(inside):
            natural = 2 * (where - low[k]) / self.sizes[k] - 1
            out.append(strain_matrix(np.clip(natural, -1, 1), self.sizes[k]) @ self.u[self.dofs[k]])
        return np.mean(out, axis=0)
