"""Plane-stress finite elements of a round eye in a long strip; writes eye-in-strip.json beside this file.

Quarter model, 8-node quadrilaterals, 3 x 3 Gauss points, E = 1, depth 1, bore radius 1. Needs numpy and scipy.
`plug`: every bore point pushed out by the same amount, free to slide; radial force and hoop strain come back.
`squeeze`: the strip's edges pressed in over a patch; growth of the eye along the strip and bore strain come back.
"""

import json
from pathlib import Path

import numpy as np
import scipy.sparse as sparse
from scipy.sparse.linalg import spsolve

GAUSS = [(-np.sqrt(0.6), 5 / 9), (0.0, 8 / 9), (np.sqrt(0.6), 5 / 9)]
CORNERS = [(-1, -1), (1, -1), (1, 1), (-1, 1)]
NODES = CORNERS + [(0, -1), (1, 0), (0, 1), (-1, 0)]


def shape_gradient(x, y):
    d = np.zeros((2, 8))
    for i, (a, b) in enumerate(CORNERS):
        d[0, i] = 0.25 * a * (1 + b * y) * (2 * a * x + b * y)
        d[1, i] = 0.25 * b * (1 + a * x) * (a * x + 2 * b * y)
    for i, b in ((4, -1), (6, 1)):
        d[0, i], d[1, i] = -x * (1 + b * y), 0.5 * b * (1 - x * x)
    for i, a in ((5, 1), (7, -1)):
        d[0, i], d[1, i] = 0.5 * a * (1 - y * y), -y * (1 + a * x)
    return d


def mesh(half_width, half_length, around=24, outward=14, along=16, round_rim=False):
    """Fan from the bore to the square round it, then a rectangle to the strip's end. Bore radius 1."""
    index, points, elements = {}, [], []

    def add(x, y):
        key = (round(x, 9), round(y, 9))
        if key not in index:
            index[key] = len(points)
            points.append((x, y))
        return index[key]

    def rim(angle):
        if round_rim:
            return half_width * np.cos(angle), half_width * np.sin(angle)
        t = np.tan(angle)
        return (half_width, half_width * t) if angle <= np.pi / 4 else (half_width / t, half_width)

    grades = np.cumsum(np.r_[0, 1.12 ** np.arange(outward)])
    grades /= grades[-1]
    radial = np.zeros(2 * outward + 1)
    radial[::2], radial[1::2] = grades, (grades[:-1] + grades[1:]) / 2
    angles = np.linspace(0, np.pi / 2, 2 * around + 1)
    fan = np.full((2 * around + 1, 2 * outward + 1), -1)
    for i, angle in enumerate(angles):
        rx, ry = rim(angle)
        for j, g in enumerate(radial):
            if not (i % 2 and j % 2):
                fan[i, j] = add(np.cos(angle) * (1 - g) + rx * g, np.sin(angle) * (1 - g) + ry * g)
    for i in range(0, 2 * around, 2):
        for j in range(0, 2 * outward, 2):
            elements.append([fan[i, j], fan[i, j + 2], fan[i + 2, j + 2], fan[i + 2, j],
                             fan[i, j + 1], fan[i + 1, j + 2], fan[i + 2, j + 1], fan[i + 1, j]])
    if not round_rim:
        heights = [points[fan[i, -1]][1] for i in range(around + 1)]
        lengths = half_width + (half_length - half_width) * np.linspace(0, 1, 2 * along + 1) ** 1.3
        bar = np.full((2 * along + 1, around + 1), -1)
        for i, x in enumerate(lengths):
            for j, y in enumerate(heights):
                if not (i % 2 and j % 2):
                    bar[i, j] = add(x, y)
        for i in range(0, 2 * along, 2):
            for j in range(0, around, 2):
                elements.append([bar[i, j], bar[i + 2, j], bar[i + 2, j + 2], bar[i, j + 2],
                                 bar[i + 1, j], bar[i + 2, j + 1], bar[i + 1, j + 2], bar[i, j + 1]])
    return np.array(points), np.array(elements), fan[:, 0]


def stiffness(points, elements, poisson):
    law = np.array([[1, poisson, 0], [poisson, 1, 0], [0, 0, (1 - poisson) / 2]]) / (1 - poisson**2)
    rows, columns, values = [], [], []
    for element in elements:
        k = np.zeros((16, 16))
        for x, wx in GAUSS:
            for y, wy in GAUSS:
                d = shape_gradient(x, y)
                jacobian = d @ points[element]
                g = np.linalg.solve(jacobian, d)
                b = np.zeros((3, 16))
                b[0, ::2], b[1, 1::2], b[2, ::2], b[2, 1::2] = g[0], g[1], g[1], g[0]
                k += b.T @ law @ b * np.linalg.det(jacobian) * wx * wy
        dof = np.stack([2 * element, 2 * element + 1], 1).ravel()
        rows.append(np.repeat(dof, 16))
        columns.append(np.tile(dof, 16))
        values.append(k.ravel())
    size = 2 * len(points)
    data = (np.concatenate(values), (np.concatenate(rows), np.concatenate(columns)))
    return sparse.csr_matrix(data, (size, size))


def hoop_strain(points, elements, u, bore):
    """Hoop strain at the bore nodes, mean of the elements that meet there."""
    seen = {node: [] for node in bore}
    for element in elements:
        for local, node in enumerate(element):
            if node in seen:
                d = shape_gradient(*NODES[local])
                gradient = np.linalg.solve(d @ points[element], d) @ u.reshape(-1, 2)[element]
                angle = np.arctan2(points[node, 1], points[node, 0])
                t = np.array([-np.sin(angle), np.cos(angle)])
                seen[node].append(t @ gradient @ t)
    return np.array([np.mean(seen[node]) for node in bore])


def symmetry(points, skip=()):
    fixed = {}
    for node, (x, y) in enumerate(points):
        if node in skip:
            continue
        if abs(x) < 1e-9:
            fixed[2 * node] = 0.0
        if abs(y) < 1e-9:
            fixed[2 * node + 1] = 0.0
    return fixed


def solve(k, load, fixed):
    held = np.array(list(fixed))
    values = np.array(list(fixed.values()))
    free = np.setdiff1d(np.arange(k.shape[0]), held)
    u = np.zeros(k.shape[0])
    u[held] = values
    u[free] = spsolve(k[free][:, free].tocsc(), load[free] - k[free][:, held] @ values)
    return u


def plug(half_width, poisson, half_length=None, **mesh_options):
    """Radial force for a bore growth of 1, all round, and the bore's hoop strain."""
    points, elements, bore = mesh(half_width, half_length or 5 * half_width, **mesh_options)
    turn = sparse.lil_matrix(sparse.eye(2 * len(points)))
    angles = np.arctan2(points[bore, 1], points[bore, 0])
    for node, angle in zip(bore, angles):
        c, s = np.cos(angle), np.sin(angle)
        turn[2 * node, 2 * node], turn[2 * node, 2 * node + 1] = c, -s
        turn[2 * node + 1, 2 * node], turn[2 * node + 1, 2 * node + 1] = s, c
    turn = turn.tocsr()
    k = turn.T @ stiffness(points, elements, poisson) @ turn
    fixed = symmetry(points, skip=set(bore.tolist()))
    for node in bore:
        fixed[2 * node] = 1.0
    fixed[2 * bore[0] + 1] = fixed[2 * bore[-1] + 1] = 0.0
    u = solve(k, np.zeros(k.shape[0]), fixed)
    radial = (k @ u)[2 * bore]
    assert radial.min() > 0, "the plug would lose contact"
    return 4 * radial.sum(), hoop_strain(points, elements, turn @ u, bore), angles


def squeeze(half_width, half_patch, poisson, **mesh_options):
    """Growth of the eye along the strip and the bore's hoop strain for opposed loads of 1 on both edges."""
    points, elements, bore = mesh(half_width, 5 * half_width, **mesh_options)
    load = np.zeros(2 * len(points))
    for element in elements:
        for a, m, b in ((0, 4, 1), (1, 5, 2), (2, 6, 3), (3, 7, 0)):
            nodes = element[[a, m, b]]
            if np.any(np.abs(points[nodes, 1] - half_width) > 1e-9):
                continue
            x0, x1 = points[nodes[0], 0], points[nodes[2], 0]
            low, high = min(x0, x1), min(max(x0, x1), half_patch)
            for xi, weight in GAUSS:
                if high <= low:
                    break
                s = 2 * ((low + high) / 2 + xi * (high - low) / 2 - x0) / (x1 - x0) - 1
                for node, n in zip(nodes, (s * (s - 1) / 2, 1 - s * s, s * (s + 1) / 2)):
                    load[2 * node + 1] -= n * weight * (high - low) / 2 / (2 * half_patch)
    u = solve(stiffness(points, elements, poisson), load, symmetry(points))
    return 2 * u[2 * bore[0]], -2 * u[2 * bore[-1] + 1], hoop_strain(points, elements, u, bore)


def lame(half_width, poisson):
    return 2 * np.pi / ((half_width**2 + 1) / (half_width**2 - 1) + poisson)


def main():
    ring, _, _ = plug(2.0, 0.35, round_rim=True)
    assert abs(ring / lame(2.0, 0.35) - 1) < 1e-4, "the flat ring must match Lame"
    cases = []
    for poisson in (0.35, 0.45):
        for ratio in (0.2, 0.3, 0.35, 0.4, 0.5, 0.6, 0.7, 0.75):
            force, hoop, angles = plug(1 / ratio, poisson)
            peak = int(np.argmax(hoop))
            cases.append({"kind": "plug", "eyeOverWidth": ratio, "poisson": poisson,
                          "forceOverLame": round(force / lame(1 / ratio, poisson), 4),
                          "peakOverMean": round(float(hoop[peak]), 4),
                          "peakAt": round(float(np.degrees(angles[peak])), 1)})
    for ratio in (0.2, 0.25, 0.3, 0.35, 0.4, 0.5, 0.6, 0.7):
        for patch in (0.5, 1.0, 2.0):
            growth, narrowing, hoop = squeeze(1 / ratio, patch, 0.35)
            cases.append({"kind": "squeeze", "eyeOverWidth": ratio, "patchOverEye": patch, "poisson": 0.35,
                          "growth": round(float(growth), 4), "narrowingOverGrowth": round(float(narrowing / growth), 4),
                          "strainOverGrowth": round(float(hoop.max() / (growth / 2)), 4)})
    text = ",\n  ".join(json.dumps(case) for case in cases)
    Path(__file__).with_name("eye-in-strip.json").write_text(f"[\n  {text}\n]\n")


if __name__ == "__main__":
    main()
