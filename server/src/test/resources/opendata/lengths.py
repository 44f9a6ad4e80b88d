"""Aligns sequences of sentence lengths with NLTK's form of the model of Gale and Church.

Standard input: a JSON list of pairs [source lengths, target lengths].
Standard output: for each pair the list of [source index, target index] that it links.
"""

import json
import sys

from nltk.translate.gale_church import LanguageIndependent, align_blocks

constants = {
    "average": LanguageIndependent.AVERAGE_CHARACTERS,
    "variance": LanguageIndependent.VARIANCE_CHARACTERS,
    "priors": {f"{s}-{t}": p for (s, t), p in LanguageIndependent.PRIORS.items()},
}
links = [align_blocks(source, target) for source, target in json.load(sys.stdin)]
json.dump({"constants": constants, "links": links}, sys.stdout)
