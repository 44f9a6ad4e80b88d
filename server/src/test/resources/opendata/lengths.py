"""Aligns sequences of sentence lengths with NLTK's form of the model of Gale and Church.

Standard input: a JSON list of pairs [source lengths, target lengths].
Standard output: for each pair the list of [source index, target index] that it links; under
"exact" the same once NLTK is given a tail of the normal distribution that never comes to 0.
"""

import json
import math
import sys

from nltk.translate import gale_church
from nltk.translate.gale_church import LanguageIndependent, align_blocks


def log_tail(z):
    """Natural log of the normal distribution's tail from z >= 0 on, far out by its series."""
    if z < 30:
        return math.log(math.erfc(z / math.sqrt(2)) / 2)
    series = math.log1p((-1 + 3 / z**2) / z**2)
    return -z * z / 2 - math.log(z * math.sqrt(2 * math.pi)) + series


pairs = json.load(sys.stdin)
links = [align_blocks(source, target) for source, target in pairs]
gale_church.norm_logsf = log_tail
exact = [align_blocks(source, target) for source, target in pairs]

constants = {
    "average": LanguageIndependent.AVERAGE_CHARACTERS,
    "variance": LanguageIndependent.VARIANCE_CHARACTERS,
    "priors": {f"{s}-{t}": p for (s, t), p in LanguageIndependent.PRIORS.items()},
}
json.dump({"constants": constants, "links": links, "exact": exact}, sys.stdout)
