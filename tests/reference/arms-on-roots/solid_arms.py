"""Arms on blocks, walls and panels in CalculiX: the solid cases of cases.json (NU below for those at another Poisson's ratio).

A quarter of each arm is meshed with 20-node bricks (C3D20R) in a structured grid: x across the thickness (bending),
y along the width, z along the arm. x = 0 is a plane of antisymmetry, y = 0 one of symmetry. The tip carries a
parabolic shear; the result is E b y / P and the highest surface strain x E / P.

Needs Python 3 with numpy, and ccx 2.20 on the path:  python3 solid_arms.py
"""
import os
import subprocess
import tempfile

import numpy as np

E, NU = 1500.0, 0.35
CORNERS = [(0, 0, 0), (2, 0, 0), (2, 2, 0), (0, 2, 0), (0, 0, 2), (2, 0, 2), (2, 2, 2), (0, 2, 2),
           (1, 0, 0), (2, 1, 0), (1, 2, 0), (0, 1, 0), (1, 0, 2), (2, 1, 2), (1, 2, 2), (0, 1, 2),
           (0, 0, 1), (2, 0, 1), (2, 2, 1), (0, 2, 1)]
TOP = [4, 5, 6, 7, 12, 13, 14, 15]


def growing(start, end, first, rate, largest=1e9):
    """Grid lines from start to end: first cell `first`, each `rate` times the last, none over `largest`."""
    lines, size = [start], first
    while lines[-1] < end - 1e-9:
        lines.append(lines[-1] + min(size, largest))
        size *= rate
    lines = np.array(lines)
    return start + (lines - start) * (end - start) / (lines[-1] - start)


def mesh(xs, ys, zs, inside):
    """Nodes and bricks of the grid cells whose centre lies inside."""
    with_middles = lambda a: np.sort(np.concatenate([a, (a[1:] + a[:-1]) / 2]))
    X, Y, Z = with_middles(xs), with_middles(ys), with_middles(zs)
    centre = lambda a: (a[1:] + a[:-1]) / 2
    cells = np.argwhere(inside(centre(xs)[:, None, None], centre(ys)[None, :, None], centre(zs)[None, None, :]))
    number = lambda i, j, k: (i * len(Y) + j) * len(Z) + k
    bricks = np.stack([number(2 * cells[:, 0] + a, 2 * cells[:, 1] + b, 2 * cells[:, 2] + c) for a, b, c in CORNERS], 1)
    used, bricks = np.unique(bricks, return_inverse=True)
    bricks = bricks.reshape(-1, 20)
    return X[used // (len(Y) * len(Z))], Y[(used // len(Z)) % len(Y)], Z[used % len(Z)], bricks


def tip_load(x, y, z, bricks, height, traction):
    """Nodal forces of a traction along x on the faces at z = height."""
    force = np.zeros(len(x))
    points, weights = np.array([-0.6 ** 0.5, 0, 0.6 ** 0.5]), np.array([5, 8, 5]) / 9
    for brick in bricks:
        face = brick[TOP]
        if not np.allclose(z[face], height):
            continue
        area = np.ptp(x[face]) * np.ptp(y[face]) / 4
        for a, wa in zip(points, weights):
            for b, wb in zip(points, weights):
                shape = np.array([(1 - a) * (1 - b) * (-a - b - 1), (1 + a) * (1 - b) * (a - b - 1),
                                  (1 + a) * (1 + b) * (a + b - 1), (1 - a) * (1 + b) * (-a + b - 1),
                                  2 * (1 - a * a) * (1 - b), 2 * (1 + a) * (1 - b * b),
                                  2 * (1 - a * a) * (1 + b), 2 * (1 - a) * (1 - b * b)]) / 4
                force[face] += shape * traction(shape @ x[face]) * wa * wb * area
    return force


def solve(x, y, z, bricks, held, planes, force):
    """Displacements from CalculiX; `planes` lists (nodes, direction) that do not move."""
    with tempfile.TemporaryDirectory() as folder:
        with open(os.path.join(folder, "arm.inp"), "w") as out:
            out.write("*NODE,NSET=ALL\n")
            out.writelines(f"{i + 1},{a:.9g},{b:.9g},{c:.9g}\n" for i, (a, b, c) in enumerate(zip(x, y, z)))
            out.write("*ELEMENT,TYPE=C3D20R,ELSET=EL\n")
            for i, brick in enumerate(bricks + 1):
                out.write(f"{i + 1}," + ",".join(map(str, brick[:15])) + ",\n" + ",".join(map(str, brick[15:])) + "\n")
            out.write(f"*MATERIAL,NAME=M\n*ELASTIC\n{E},{NU}\n*SOLID SECTION,ELSET=EL,MATERIAL=M\n*BOUNDARY\n")
            out.writelines(f"{i + 1},1,3\n" for i in np.flatnonzero(held))
            for nodes, direction in planes:
                out.writelines(f"{i + 1},{direction},{direction}\n" for i in np.flatnonzero(nodes & ~held))
            out.write("*STEP\n*STATIC\n*CLOAD\n")
            out.writelines(f"{i + 1},1,{force[i]:.9g}\n" for i in np.flatnonzero(force))
            out.write("*NODE PRINT,NSET=ALL\nU\n*END STEP\n")
        subprocess.run(["ccx", "arm"], cwd=folder, check=True, capture_output=True)
        rows = [line.split() for line in open(os.path.join(folder, "arm.dat"))]
    moved = np.zeros((len(x), 3))
    for row in rows:
        if len(row) == 4:
            moved[int(row[0]) - 1] = [float(value) for value in row[1:]]
    return moved


def strain_along(points, moved, order):
    """Highest compression along a line of nodes, from its stretch over each element."""
    points, moved = points[np.argsort(order)], moved[np.argsort(order)]
    steps = points[2::2] - points[:-2:2]
    stretch = ((moved[2::2] - moved[:-2:2]) * steps).sum(1) / (steps ** 2).sum(1)
    return -stretch.min() * E


def narrowed(z, radius):
    """How far a fillet stands out from the arm at height z."""
    return np.where(z < radius, radius - np.sqrt(np.maximum(0, radius ** 2 - (radius - z) ** 2)), 0)


def standing(h, b, L, R, root, W=None, tw=None, S=None, b_tip=None, rows=6, across=3):
    """Arm with fillet R on a block (W its width, None for endless) or on a wall tw thick, W wide, held over span S."""
    foot = h / 2 + R
    inner = np.cumsum(np.concatenate([[0], 1.5 ** -np.arange(across)]))
    inner *= foot / inner[-1]
    rising = np.sort(R - R * np.sin(np.linspace(np.pi / 2, 0, rows + 1)))
    above = growing(R, L, rising[-1] - rising[-2], 1.45, h * 0.9)
    width = b / 2 - growing(0, b / 2, min(h / 3, b / 4) * 0.6, 1.6, b / 6)[::-1]
    cell, side = inner[-1] - inner[-2], width[-1] - width[-2]
    if root == "block":
        far = 6 * h + 3 * b
        half, reach = (W / 2 if W else b / 2 + far), foot + far
        below, outer = -growing(0, far, cell, 2.0)[::-1], growing(foot, reach, cell, 1.9)
    else:
        half, reach = W / 2, S / 2
        layer = growing(0, tw / 2, min(cell, tw / 4), 1.5)
        below = np.unique(np.round(np.concatenate([-tw + layer, -layer]), 9))
        outer = growing(foot, reach, cell, 1.6, S / 12)
    beside = growing(b / 2, half, side, 1.9 if root == "block" else 1.6, 1e9 if root == "block" else W / 10) \
        if half > b / 2 + 1e-6 else np.array([b / 2])
    x, y, z, bricks = mesh(np.concatenate([inner, outer[1:]]), np.concatenate([width, beside[1:]]),
                           np.concatenate([below, rising[1:], above[1:]]),
                           lambda u, v, w: (w < 0) | ((u < foot) & (v < b / 2)))
    held = x > reach - 1e-6
    if root == "block":
        held |= z < z.min() + 1e-6
        if not W:
            held |= y > half - 1e-6
    face, line = np.isclose(x, foot), y.copy()
    arm = z > 1e-9
    x[arm] *= (h / 2 + narrowed(z[arm], R)) / foot
    y[arm] *= 1 - (1 - (b_tip or b) / b) * z[arm] / L
    area = h * (b_tip or b)
    force = tip_load(x, y, z, bricks, L, lambda u: 1.5 / area * (1 - (2 * u / h) ** 2))
    flat = np.abs(x) < 1e-6
    moved = solve(x, y, z, bricks, held, [(flat, 2), (flat, 3), (np.abs(y) < 1e-6, 2)], force)
    points, peak = np.c_[x, y, z], 0
    for at in (0, b / 2):
        rise = np.flatnonzero(face & (z > -1e-9) & (z <= min(0.8 * L, 3 * R + h)) & np.isclose(line, at))
        run = np.flatnonzero((np.abs(z) < 1e-9) & (x >= foot - 1e-9) & (x < foot + h) & np.isclose(line, at))
        peak = max(peak, strain_along(points[rise], moved[rise], z[rise]))
        if root == "wall":
            peak = max(peak, strain_along(points[run], moved[run], x[run]))
    return E * b * (force @ moved[:, 0]) / force.sum(), peak


def in_panel(h, b, L, R, S, D, slot=None, rows=4):
    """Arm in the plane of a panel h thick, held at y = S/2 and z = -D, freed by a slot or grown from the free edge."""
    foot, side = b / 2 + R, b / 2 + (slot or 0)
    rising = np.sort(R - R * np.sin(np.linspace(np.pi / 2, 0, rows + 1)))
    first = min(b / 6, h / 2, R / 2)
    width = foot - growing(0, foot, first, 1.4, b / 4)[::-1]
    up = np.concatenate([rising, growing(R, L, rising[-1] - rising[-2], 1.4, min(h * 0.9, L / 6))[1:]])
    below = -growing(0, D, rising[1], 1.6, D / 6)[::-1]
    cell = width[-1] - width[-2]
    if slot is None:
        ys, zs = np.concatenate([width, growing(foot, S / 2, cell, 1.4, S / 16)[1:]]), np.concatenate([below, up[1:]])
        inside = lambda u, v, w: ((w < 0) | (v < foot)) & (u > -1)
    else:
        gap = growing(foot, side, cell, 1.4) if side > foot + 1e-9 else np.array([foot])
        last = gap[-1] - gap[-2] if len(gap) > 1 else cell
        ys = np.concatenate([width, gap[1:], growing(side, S / 2, max(last, slot / 3), 1.4, S / 12)[1:]])
        zs = np.concatenate([below, up[1:], [L + slot], growing(L + slot, L + slot + D, slot / 2, 1.6, D / 4)[1:]])
        cut = lambda v, w: ((v > foot) & (v < side) & (w > 0) & (w < L + slot)) | ((v < foot) & (w > L) & (w < L + slot))
        inside = lambda u, v, w: ~cut(v, w) & (u > -1)
    x, y, z, bricks = mesh(np.linspace(0, h / 2, 3), ys, zs, inside)
    held = (y > S / 2 - 1e-6) | (z < -D + 1e-6)
    if slot is not None:
        held |= z > z.max() - 1e-6
    line, arm = y.copy(), (y <= foot + 1e-9) & (z > 1e-9) & (z <= L + 1e-9)
    y[arm] *= (b / 2 + narrowed(z[arm], R)) / foot
    tip = np.array([brick for brick in bricks if np.all(line[brick] <= foot + 1e-9)])
    force = tip_load(x, y, z, tip, L, lambda u: 1.5 / (b * h) * (1 - (2 * u / h) ** 2))
    flat = np.abs(x) < 1e-6
    moved = solve(x, y, z, bricks, held, [(flat, 2), (flat, 3), (np.abs(line) < 1e-6, 2)], force)
    corner = np.flatnonzero(np.isclose(x, h / 2) & np.isclose(line, foot) & (z >= -1e-9) & (z < min(0.6 * L, 3 * b)))
    peak = strain_along(np.c_[x, y, z][corner], moved[corner], z[corner])
    return E * b * (force @ moved[:, 0]) / force.sum(), peak


if __name__ == "__main__":
    print("block b/h 3, R/h 0.5:", standing(2, 6, 12, 1, "block"))
    print("wall 1 mm, W = 3 b:", standing(2, 6, 12, 1, "wall", W=18, tw=1, S=40))
    print("panel edge:", in_panel(2, 6, 12, 1, 24, 9))
    print("slotted panel:", in_panel(2, 6, 20, 1, 30, 9, slot=1.2))
