"""One study in vectorised NumPy: the same people, place, rules and answers as bench/study-40k-ratio.mjs.

Reads a JSON description from standard input (path and rows of a file of 32-bit floats, place, rule numbers), counts
the same things from the same columns several times, and writes the least time and the counts as JSON.
"""

import json
import math
import sys
import time

import numpy as np

POUNDS_PER_KG = 1 / 0.45359237
NEWTONS_PER_POUND_FORCE = 4.4482216152605


def sink_under(foam, weight):
    pressure = weight * np.float32(0.7 * 0.78 * POUNDS_PER_KG / 110)
    first = foam["ifd25N"] / NEWTONS_PER_POUND_FORCE / 50
    last = foam["supportFactor"] * first
    strain = np.interp(pressure, (0, first, last), (0, 0.25, 0.65))
    return (strain * foam["thicknessMm"]).astype(np.float32)


def lines(place, rules, body, wear, lens, tolerance):
    """Yields for every rule its measures and the pass and fail tests of its sides, each a boolean array."""
    shoe, clothing, clothes_on_lap = wear["shoeMm"], wear["clothingMm"], wear["lapMm"]
    sink = sink_under(place["foam"], body["weight_kg"])
    front = place["seatTopFrontMm"] - sink
    hip = place["seatTopHipMm"] - sink
    table, sill = place["table"], place["sills"][0]
    t = tolerance

    r = rules["SEAT-02"]
    reach = body["popliteal_height"] + shoe
    low, high = math.cos(math.radians(r["steepDeg"])), math.cos(math.radians(r["levelDeg"]))
    steep, level, by = front - reach * low, reach * high - front, r["allowanceMm"]
    yield "SEAT-02", ["popliteal_height"], (steep >= -t) & (level >= -t), (steep >= -by - t) & (level >= -by - t)

    r, depth, thigh = rules["SEAT-04"], place["effectiveDepthMm"], body["buttock_popliteal_length"]
    yield (
        "SEAT-04",
        ["buttock_popliteal_length"],
        (thigh <= (depth + t) / r["passLowerShare"]) & (thigh >= (depth - t) / r["passUpperShare"]),
        (thigh <= (depth + t) / r["failLowerShare"]) & (thigh >= (depth - t) / r["failUpperShare"]),
    )

    hips, width = body["hip_breadth_sitting"], place["widthMm"]
    yield "SEAT-05", ["hip_breadth_sitting"], hips <= width - clothing + t, hips <= width + t

    room = table["undersideMm"] - hip - body["thigh_clearance"]
    by = rules["TABLE-01"]["allowanceMm"]
    yield "TABLE-01", ["thigh_clearance"], room >= by + clothes_on_lap - t, room >= clothes_on_lap - t

    knee, by = body["knee_height_sitting"], rules["TABLE-02"]["allowanceMm"]
    under = table["undersideMm"] - shoe + t
    yield "TABLE-02", ["knee_height_sitting"], knee <= under - by, knee <= under

    r, elbow, shoulder = rules["TABLE-05"], body["elbow_rest_height"], body["acromial_height_sitting"]
    over = table["topMm"] - hip
    lower = over - elbow
    upper = elbow * r["elbowShare"] + shoulder * r["shoulderShare"] - over
    yield (
        "TABLE-05",
        ["elbow_rest_height", "acromial_height_sitting"],
        (lower >= -t) & (upper >= -t),
        (lower >= -r["allowanceLowerMm"] - t) & (upper >= -r["allowanceUpperMm"] - t),
    )

    r, belly = rules["TABLE-06"], body["abdominal_extension_depth_sitting"]
    space = depth - table["overlapMm"] + t
    yield (
        "TABLE-06",
        ["abdominal_extension_depth_sitting"],
        belly <= space - r["passAllowanceMm"],
        belly <= space - r["failAllowanceMm"],
    )

    r = rules["SILL-01"]
    off = np.abs(sill["topMm"] - hip - elbow)
    yield "SILL-01", ["elbow_rest_height"], off <= r["passMm"] + t, off <= r["failMm"] + t

    r, elbows, side = rules["SILL-04"], body["forearm_forearm_breadth"], sill["centreToEdgeMm"]
    beside = hips <= 2 * (side + t) - clothing
    yield (
        "SILL-04",
        ["hip_breadth_sitting", "forearm_forearm_breadth"],
        beside & (elbows >= 2 * (side - t)),
        beside & (elbows >= 2 * (side - t - r["failBeyondMm"])),
    )

    r = rules["SILL-05"]
    eye = hip + body["eye_height_sitting"]
    over_sill = eye - (r["slumpMm"] + sill["topMm"])
    yield "SILL-05", ["eye_height_sitting"], over_sill >= r["passMm"] - t, over_sill >= r["failMm"] - t

    r = rules["SILL-06"]
    away = sill["centreToEdgeMm"] + sill["usableDepthMm"]
    rise = [away * math.tan(math.radians(r[name])) - t for name in ("passDeg", "failDeg")]
    over_sill = eye - (r["slumpMm"] + sill["topMm"])
    yield "SILL-06", ["eye_height_sitting"], over_sill >= rise[0], over_sill >= rise[1]

    before = body["buttock_knee_length"] - belly <= table["kneeDepthMm"] + t
    yield "TABLE-03", ["buttock_knee_length", "abdominal_extension_depth_sitting"], before, before

    r, everyone = rules["TABLE-04"], np.ones(len(elbow), bool)
    foot = table["footDepthMm"] + t
    yield "TABLE-04", [], everyone & (foot >= r["passMm"]), everyone & (foot >= r["failMm"])

    r = rules["HEAD-02"]
    head = place["overhead"]["undersideMm"] - hip - body["sitting_height"]
    yield "HEAD-02", ["sitting_height"], head >= r["allowanceMm"] - t, head >= -t

    by = rules["HEAD-03"]["allowanceMm"]
    stands = body["stature"] <= place["overheadAhead"]["undersideMm"] - shoe - by + t
    yield "HEAD-03", [], stands, stands

    r = rules["HEAD-05"]
    from_lens = np.abs(eye - (r["slumpMm"] + lens))
    yield "HEAD-05", ["eye_height_sitting"], from_lens <= r["passMm"] + t, from_lens <= r["failMm"] + t

    r = rules["BACK-03"]
    back = place["backTopMm"] - hip
    supported = back - shoulder * r["shoulderShare"] >= -t
    yield "BACK-03", ["acromial_height_sitting"], supported, supported | (back >= r["failMm"] - t)

    by, wall = rules["SIDE-03"]["allowanceMm"], place["wallMm"]["left"] + t
    clear = elbows <= 2 * (wall - by)
    shoulders = body["bideltoid_breadth"]
    yield "SIDE-03", ["forearm_forearm_breadth", "bideltoid_breadth"], clear, clear | (shoulders <= 2 * (wall - by))


def tally(people, women):
    of_women = int(np.count_nonzero(people & women))
    return {"women": of_women, "men": int(np.count_nonzero(people)) - of_women}


def study(asked, body, women):
    everyone = {key: (float(column.mean(dtype=float)), float(column.std(dtype=float))) for key, column in body.items()}
    checks, fits = {}, {}
    all_fit = np.ones(len(women), bool)
    all_tight = all_fit.copy()
    for rule, reads, passed, within in lines(
        asked["place"], asked["rules"], body, asked["wear"], asked["lensHeightMm"], asked["toleranceMm"]
    ):
        at_least = passed | within
        all_fit &= passed
        all_tight &= at_least
        fits[rule] = passed
        lost = ~passed
        of = int(np.count_nonzero(lost))
        traits = {}
        if of > 0:
            for key in ["stature", "weight_kg", *reads]:
                mean, sd = everyone[key]
                lost_mean = float(body[key][lost].mean(dtype=float))
                rest_mean = (mean * len(lost) - lost_mean * of) / max(1, len(lost) - of)
                traits[key] = (lost_mean, rest_mean, (lost_mean - rest_mean) / sd)
        checks[rule] = {
            "fits": tally(passed, women),
            "atLeastTight": tally(at_least, women),
            "traits": traits,
        }
    lost_by = {rule: len(passed) - int(np.count_nonzero(passed)) for rule, passed in fits.items()}
    most = max(lost_by, key=lost_by.get)
    left = fits[most]
    lost_next = {rule: int(np.count_nonzero(left & ~passed)) for rule, passed in fits.items() if rule != most}
    nearest = max(lost_next, key=lost_next.get)
    return {
        "all": {"fits": tally(all_fit, women), "atLeastTight": tally(all_tight, women)},
        "checks": checks,
        "rejectsMost": most,
        "rejectsNext": nearest,
    }


def main():
    asked = json.load(sys.stdin)
    rows = np.fromfile(asked["file"], np.float32).reshape(len(asked["columns"]) + 1, -1)
    body = dict(zip(asked["columns"], rows))
    women = rows[-1] == 1
    times = []
    for _ in range(asked["warmUp"] + asked["runs"]):
        start = time.perf_counter()
        counts = study(asked, body, women)
        times.append(time.perf_counter() - start)
    json.dump({"leastMs": 1000 * min(times), "counts": counts}, sys.stdout)


main()
