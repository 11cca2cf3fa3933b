"""Square rubber column bonded to stiff plates: stiffness in compression and in shear, as a solid.

Compression: an eighth, planes of symmetry through the axis and at mid-height. Shear: a quarter, mid-height and x = 0 planes of
antisymmetry. Linear, E 1 MPa, Poisson's ratio 0.465. Stiffness over that of the plain bar E a^2 / h.

Needs Python 3 with numpy and scipy:  python3 column.py > columns.json
"""
import json
import pathlib
import sys

sys.path.append(str(pathlib.Path(__file__).parent.parent / "solids"))
from bricks import Solid, spaced, stiffness  # noqa: E402

E, NU = 1.0, 0.465


def column(side, height, fine):
    grid = spaced([0, side / 2], [fine])
    up = [0, height / 2 - side / 4, height / 2] if height > side else [0, height / 4, height / 2]
    solid = Solid(grid, grid, spaced(up, [fine, fine]), lambda x, y, z: x + y + z > 0, stiffness(E, NU))
    solid.hold(solid.on(1, 0), 1)
    return solid, solid.on(2, height / 2)


def compressed(side, height, fine=6):
    solid, top = column(side, height, fine)
    solid.hold(solid.on(0, 0), 0)
    solid.hold(solid.on(2, 0), 2)
    for direction, value in ((0, 0), (1, 0), (2, -0.5)):
        solid.hold(top, direction, value)
    solid.solve()
    return -4 * solid.reaction(top, 2).sum()


def sheared(side, height, fine=6):
    solid, top = column(side, height, fine)
    for direction in (1, 2):
        solid.hold(solid.on(0, 0), direction)
    for direction in (0, 1):
        solid.hold(solid.on(2, 0), direction)
    for direction, value in ((1, 0), (2, 0), (0, 0.5)):
        solid.hold(top, direction, value)
    solid.solve()
    return 4 * solid.reaction(top, 0).sum()


def main():
    rows = []
    for height in (4, 6, 8, 12, 16, 24, 32, 48):
        plain = E * 8 ** 2 / height
        rows.append({"side": 8, "height": height,
                     "compression": round(float(compressed(8, height) / plain), 5),
                     "compression_coarse": round(float(compressed(8, height, 4) / plain), 5),
                     "shear": round(float(sheared(8, height) / plain), 6)})
    print(json.dumps({"modulus": E, "poisson": NU, "columns": rows}, indent=1))


if __name__ == "__main__":
    main()
