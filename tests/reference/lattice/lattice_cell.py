"""One link of a slit panel bent about its slits, as a solid: moment, strain of the link and of the bridges.

The panel repeats, so a cell is enough: from the middle of one bridge (y = 0) to the middle of the next row's
(y = pitch / 2), across the fold from the middle of one slit to the middle of the next. Both bridges are cut at their
middle, where the section stays plane and turns by plus and minus half of the angle. The middle of the sheet is a plane of
antisymmetry, so only z >= 0 is meshed. 20-node bricks, 8 integration points, structured grid.

Needs Python 3 with numpy and scipy:  python3 lattice_cell.py > cells.json
"""
import json
import pathlib
import sys

import numpy as np

sys.path.append(str(pathlib.Path(__file__).parent.parent / "solids"))
from bricks import Solid, spaced, stiffness  # noqa: E402

E, NU, ANGLE = 1000.0, 0.35, 0.01


def solve(cell, fine=3):
    width, slit, thickness, pitch, bridge = cell
    edge, half = (width + slit) / 2, bridge / 2
    few = max(1, fine // 2)
    xs = spaced([-edge, -width / 2, width / 2, edge], [few, 2 * fine, few])
    ys = spaced([0, half, pitch / 2 - half, pitch / 2], [fine, 6 * fine, fine])
    zs = spaced([0, thickness / 2], [2 * fine])

    def inside(x, y, z):
        left, right = (x < -width / 2) & (y < half), (x > width / 2) & (y > pitch / 2 - half)
        return (np.abs(x) < width / 2) | left | right

    solid = Solid(xs, ys, zs, inside, stiffness(E, NU))
    for direction in (0, 1):
        solid.hold(solid.on(2, 0), direction)
    for y in (0, pitch / 2):
        solid.hold(solid.on(1, y), 1)
    for side in (-1, 1):
        face = solid.on(0, side * edge)
        solid.hold(face, 0, side * ANGLE / 2 * solid.points[face, 2])
    solid.hold(np.array([np.argmin(np.abs(solid.points - [0, pitch / 4, 0]).sum(1))]), 2)
    solid.solve()
    face = solid.on(0, edge)
    return 2 * np.sum(solid.reaction(face, 0) * solid.points[face, 2]), solid


def main():
    # width, slit, thickness, pitch, bridge
    cells = [(1.2, 0.5, 3, 24, 3), (1.2, 0.5, 3, 16, 3), (1.2, 0.5, 3, 12, 2), (2, 0.6, 2, 30, 4), (2, 0.6, 2, 16, 3),
             (3, 0.8, 2, 30, 4), (3, 0.8, 2, 20, 4), (1, 0.4, 4, 20, 3), (1, 1, 2, 14, 1.5), (1.6, 0.5, 1.6, 20, 2),
             (2.4, 0.6, 1.2, 24, 3), (0.8, 0.4, 2, 40, 2), (1.2, 0.5, 3, 24, 6), (1.2, 1.5, 3, 24, 3), (2, 1, 4, 24, 3)]
    rows = []
    for cell in cells:
        width, slit, thickness, pitch, bridge = cell
        moment, solid = solve(cell)
        coarse = solve(cell, 2)[0]
        flat = solid.strain(np.array([0, pitch / 4, thickness / 2]))
        side = solid.strain(np.array([width / 2, pitch / 4, 0.0]))
        over = solid.strain(np.array([(width + slit) / 2, pitch / 2, thickness / 2]))
        rows.append({"width": width, "slit": slit, "thickness": thickness, "pitch": pitch, "bridge": bridge,
                     "moment": round(float(moment), 5), "moment_coarse": round(float(coarse), 5),
                     "shear_face": round(float(np.hypot(flat[3], flat[5])), 7),
                     "shear_side": round(float(np.hypot(side[3], side[5])), 7),
                     "bridge_strain": round(float(over[0]), 7)})
    print(json.dumps({"modulus": E, "poisson": NU, "angle": ANGLE, "cells": rows}, indent=1))


if __name__ == "__main__":
    main()
