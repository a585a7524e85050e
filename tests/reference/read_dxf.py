"""Reads DXF files with ezdxf and says, as JSON, what it found: one object a file.

Run by /usr/bin/python3 (Debian's python3-ezdxf). The paths come as a JSON list on standard input.
Radii and centres come from ezdxf.math.bulge_to_arc, not from our own formula.
"""

import json
import sys

import ezdxf
from ezdxf.lldxf.encoding import decode_dxf_unicode
from ezdxf.math import bulge_to_arc


def arcs_of(points):
    arcs = []
    for (x, y, bulge), (x2, y2, _) in zip(points, points[1:] + points[:1]):
        if bulge != 0:
            centre, _, _, radius = bulge_to_arc((x, y), (x2, y2), bulge)
            arcs.append({"radius": radius, "centre": [centre.x, centre.y], "bulge": bulge})
    return arcs


def polyline(entity):
    if entity.dxftype() == "LWPOLYLINE":
        points = [list(p) for p in entity.get_points("xyb")]
        closed = entity.closed
    else:
        points = [
            [v.dxf.location.x, v.dxf.location.y, v.dxf.get("bulge", 0)] for v in entity.vertices
        ]
        closed = entity.is_closed
    return {
        "type": entity.dxftype(),
        "layer": entity.dxf.layer,
        "closed": bool(closed),
        "points": points,
        "arcs": arcs_of(points),
    }


def text(entity):
    # The codes of TEXT (%%d, ^J) first, then \U+XXXX, so that a code cannot hide in a character.
    plain = decode_dxf_unicode(entity.plain_text())
    return {"layer": entity.dxf.layer, "plain": plain}


def read(path):
    document = ezdxf.readfile(path)
    auditor = document.audit()
    entities = list(document.modelspace())
    lines = [e for e in entities if e.dxftype() in ("LWPOLYLINE", "POLYLINE")]
    texts = [e for e in entities if e.dxftype() == "TEXT"]
    return {
        "version": document.dxfversion,
        "insunits": document.header.get("$INSUNITS"),
        "layers": [layer.dxf.name for layer in document.layers],
        "errors": [str(e.message) for e in auditor.errors],
        "fixes": [str(e.message) for e in auditor.fixes],
        "polylines": [polyline(e) for e in lines],
        "texts": [text(e) for e in texts],
        "others": sorted({e.dxftype() for e in entities} - {"LWPOLYLINE", "POLYLINE", "TEXT"}),
    }


json.dump([read(path) for path in json.load(sys.stdin)], sys.stdout)
