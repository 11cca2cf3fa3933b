"""One link of a slit panel bent about its slits, as a solid: moment, strain of the link and of the bridges.

The panel repeats, so a cell is enough: from the middle of one bridge (y = 0) to the middle of the next row's
(y = pitch / 2), across the fold from the middle of one slit to the middle of the next. Both bridges are cut at their
middle, where the section stays plane and turns by plus and minus half of the angle. The middle of the sheet is a plane of
antisymmetry, so only z >= 0 is meshed. 20-node bricks, 8 integration points, structured grid.

Needs Python 3 with numpy and scipy:  python3 lattice_cell.py > cells.json
"""
import json

import numpy as np
from scipy.sparse import coo_matrix
from scipy.sparse.linalg import spsolve

E, NU, ANGLE = 1000.0, 0.35, 0.01
CORNERS = np.array([(0, 0, 0), (2, 0, 0), (2, 2, 0), (0, 2, 0), (0, 0, 2), (2, 0, 2), (2, 2, 2), (0, 2, 2),
                    (1, 0, 0), (2, 1, 0), (1, 2, 0), (0, 1, 0), (1, 0, 2), (2, 1, 2), (1, 2, 2), (0, 1, 2),
                    (0, 0, 1), (2, 0, 1), (2, 2, 1), (0, 2, 1)])
NATURAL = CORNERS - 1.0
LAME, G = E * NU / ((1 + NU) * (1 - 2 * NU)), E / (2 * (1 + NU))
D = np.diag([2 * G + LAME] * 3 + [G] * 3)
D[:3, :3] += LAME * (1 - np.eye(3))


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


def grid(cell, fine):
    width, slit, thickness, pitch, bridge = cell
    spaced = lambda a, b, n: np.linspace(a, b, n + 1)[1:]
    edge = (width + slit) / 2
    xs = np.concatenate([[-edge], spaced(-edge, -width / 2, max(1, fine // 2)),
                         spaced(-width / 2, width / 2, 2 * fine), spaced(width / 2, edge, max(1, fine // 2))])
    ends = bridge / 2
    ys = np.concatenate([[0.0], spaced(0, ends, fine), spaced(ends, pitch / 2 - ends, 6 * fine),
                         spaced(pitch / 2 - ends, pitch / 2, fine)])
    return xs, ys, np.linspace(0, thickness / 2, 2 * fine + 1)


def solve(cell, fine=3):
    width, slit, thickness, pitch, bridge = cell
    xs, ys, zs = grid(cell, fine)
    middles = lambda a: np.sort(np.concatenate([a, (a[1:] + a[:-1]) / 2]))
    centre = lambda a: (a[1:] + a[:-1]) / 2
    X, Y, Z = middles(xs), middles(ys), middles(zs)
    x, y = centre(xs)[:, None, None], centre(ys)[None, :, None]
    strip = np.abs(x) < width / 2
    left, right = (x < -width / 2) & (y < bridge / 2), (x > width / 2) & (y > pitch / 2 - bridge / 2)
    cells = np.argwhere(np.broadcast_to(strip | left | right, (len(xs) - 1, len(ys) - 1, len(zs) - 1)))
    number = ((2 * cells[:, None, 0] + CORNERS[:, 0]) * len(Y) + 2 * cells[:, None, 1] + CORNERS[:, 1]) * len(Z)
    used, bricks = np.unique(number + 2 * cells[:, None, 2] + CORNERS[:, 2], return_inverse=True)
    bricks = bricks.reshape(-1, 20)
    points = np.stack([X[used // (len(Y) * len(Z))], Y[(used // len(Z)) % len(Y)], Z[used % len(Z)]], 1)
    sizes = points[bricks[:, 6]] - points[bricks[:, 0]]
    dofs = (3 * bricks[:, :, None] + np.arange(3)).reshape(-1, 60)
    gauss = np.array(np.meshgrid(*[[-1, 1]] * 3)).reshape(3, -1).T / 3 ** 0.5
    matrices = {}
    for size in np.unique(sizes.round(9), axis=0):
        parts = (strain_matrix(point, size) for point in gauss)
        matrices[tuple(size)] = sum(B.T @ D @ B for B in parts) * np.prod(size) / 8
    stiff = np.stack([matrices[tuple(size)] for size in sizes.round(9)])
    n = 3 * len(points)
    K = coo_matrix((stiff.ravel(), (np.repeat(dofs, 60, 1).ravel(), np.tile(dofs, (1, 60)).ravel())), (n, n)).tocsr()
    u, held = np.zeros(n), np.zeros(n, bool)
    on = lambda axis, value: np.flatnonzero(np.abs(points[:, axis] - value) < 1e-9)
    held[3 * on(2, 0)] = held[3 * on(2, 0) + 1] = True
    held[3 * on(1, 0) + 1] = held[3 * on(1, pitch / 2) + 1] = True
    edge = (width + slit) / 2
    for side in (-1, 1):
        face = on(0, side * edge)
        held[3 * face] = True
        u[3 * face] = side * ANGLE / 2 * points[face, 2]
    held[3 * np.argmin(np.abs(points - [0, pitch / 4, 0]).sum(1)) + 2] = True
    free = ~held
    u[free] = spsolve(K[free][:, free], -(K[free][:, held] @ u[held]))
    face = on(0, edge)
    moment = 2 * np.sum((K @ u)[3 * face] * points[face, 2])
    return moment, u, points, bricks, sizes, dofs


def at(state, where):
    """Strain (6) at a point on the surface, from the brick that holds it, extrapolated from its middle points."""
    _, u, points, bricks, sizes, dofs = state
    low = points[bricks[:, 0]]
    inside = np.all((where >= low - 1e-9) & (where <= low + sizes + 1e-9), axis=1)
    out = []
    for k in np.flatnonzero(inside):
        natural = 2 * (where - low[k]) / sizes[k] - 1
        out.append(strain_matrix(np.clip(natural, -1, 1), sizes[k]) @ u[dofs[k]])
    return np.mean(out, axis=0)


def main():
    # width, slit, thickness, pitch, bridge
    cells = [(1.2, 0.5, 3, 24, 3), (1.2, 0.5, 3, 16, 3), (1.2, 0.5, 3, 12, 2), (2, 0.6, 2, 30, 4), (2, 0.6, 2, 16, 3),
             (3, 0.8, 2, 30, 4), (3, 0.8, 2, 20, 4), (1, 0.4, 4, 20, 3), (1, 1, 2, 14, 1.5), (1.6, 0.5, 1.6, 20, 2),
             (2.4, 0.6, 1.2, 24, 3), (0.8, 0.4, 2, 40, 2), (1.2, 0.5, 3, 24, 6), (1.2, 1.5, 3, 24, 3), (2, 1, 4, 24, 3)]
    rows = []
    for cell in cells:
        width, slit, thickness, pitch, bridge = cell
        state = solve(cell)
        coarse = solve(cell, 2)[0]
        flat = at(state, np.array([0, pitch / 4, thickness / 2]))
        side = at(state, np.array([width / 2, pitch / 4, 0.0]))
        over = at(state, np.array([(width + slit) / 2, pitch / 2, thickness / 2]))
        rows.append({"width": width, "slit": slit, "thickness": thickness, "pitch": pitch, "bridge": bridge,
                     "moment": round(float(state[0]), 5), "moment_coarse": round(float(coarse), 5),
                     "shear_face": round(float(np.hypot(flat[3], flat[5])), 7),
                     "shear_side": round(float(np.hypot(side[3], side[5])), 7),
                     "bridge_strain": round(float(over[0]), 7)})
    print(json.dumps({"modulus": E, "poisson": NU, "angle": ANGLE, "cells": rows}, indent=1))


main()
