"""The order of the stages, and what is done with what they leave.

``run`` goes from photographs to a bank and needs the learner; ``use`` works with a bank
or a run that stands and does not; ``desk`` is a run's folder.
"""
