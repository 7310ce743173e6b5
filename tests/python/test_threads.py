"""Members are solved in several threads at once, with the bits of a single one."""

import sys
from concurrent.futures import ThreadPoolExecutor
from pathlib import Path
from threading import Barrier, Event, Thread
from time import monotonic

import golden

from beamcore import Job, Member, Part, Section, partial, permanent, pin, rectangle, roller, timber
from beamcore.units import kN, m, mm

FOLDER = Path(__file__).parents[1] / "golden"


def bits(member: Member) -> bytes:
    field = member.solve().moment("fundamental", "final")
    return field.values_Nm([length / 10 for length in range(50)]).tobytes()


def test_two_threads_share_a_member() -> None:
    _, member = golden.two_span()
    alone = bits(member)
    start = Barrier(2)

    def work(_: int) -> set[bytes]:
        start.wait()
        return {bits(member) for _ in range(50)}

    with ThreadPoolExecutor(2) as pool:
        assert list(pool.map(work, range(2))) == [{alone}, {alone}]


def test_two_threads_solve_jobs_of_their_own() -> None:
    files = [FOLDER / f"{case}.toml" for case in ("two-span", "slab-strip")] * 20
    alone = [Job.open(file).solve().json for file in files[:2]] * 20
    with ThreadPoolExecutor(2) as pool:
        assert list(pool.map(lambda file: Job.open(file).solve().json, files)) == alone


def long_member() -> Member:
    """A member of 100 spans, whose solution takes a while."""
    joist = Part("joist", rectangle(75*mm, 220*mm), timber("C24", service_class=1))
    supports = [pin("0", 0*m), *(roller(str(i), i*m) for i in range(1, 101))]
    loads = [partial(1*kN/m, i*m, (i + 0.5)*m) for i in range(100)]
    return Member(Section([joist]), 100*m, supports, [permanent("dead", *loads)])


def test_the_lock_is_released_while_a_member_is_solved() -> None:
    member = long_member()
    go, ran = Event(), Event()

    def other() -> None:
        go.wait()
        ran.set()

    thread = Thread(target=other)
    thread.start()
    interval = sys.getswitchinterval()
    # From here the other thread runs only if this one releases the lock of itself.
    sys.setswitchinterval(1000)
    try:
        end = monotonic() + 60
        go.set()
        while not ran.is_set() and monotonic() < end:
            member.solve()
        assert ran.is_set()
    finally:
        sys.setswitchinterval(interval)
        thread.join()
