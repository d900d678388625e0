namespace TwoPhase.Passes;

// One panel: iterate its pressures, judge its error, find where a phase ends in it.
internal partial struct SteadyMarch<TFluid>
{
    private const int GreatestSweeps = 16, GreatestAims = 24;
    private const double BoundaryTolerance = 1e-11, OnBoundary = 1e-9;

    // A panel of one phase that is to end where boiling begins or ends may miss that by so much and stay of one phase: some friction
    // models have an infinite slope in quality on the other side, on which no iteration comes to rest.
    private const double OnePhaseEdge = 1e-6;

    /// <summary>Fills the four nodes above the last one.</summary>
    private Attempt Try(in Piece piece, double done, double length, double sweepTolerance)
    {
        Reserve();
        double spacing = length / Panel.Intervals;
        PassNode[] nodes = Nodes;
        int first = Count - 1;
        double p1 = Guess(spacing, length), p2 = Guess(2 * spacing, length), p3 = Guess(3 * spacing, length), p4 = Guess(length, length);
        _known = default;
        _edge = nodes[first].EquilibriumQuality is < -OnBoundary or > 1 + OnBoundary ? OnePhaseEdge : 0;
        for (int sweep = 0; sweep < GreatestSweeps; sweep++)
        {
            if ((Outside(p1) ?? Outside(p2) ?? Outside(p3) ?? Outside(p4)) is { } outside) return new(length, outside);
            Place(piece, first + 1, done + spacing, p1, sweep);
            Place(piece, first + 2, done + (2 * spacing), p2, sweep);
            Place(piece, first + 3, done + (3 * spacing), p3, sweep);
            Place(piece, first + 4, done + (4 * spacing), p4, sweep);
            double f0 = nodes[first].Loss, f1 = nodes[first + 1].Loss, f2 = nodes[first + 2].Loss, f3 = nodes[first + 3].Loss, f4 = nodes[first + 4].Loss;
            double worst = 0, sum = _momentumSum + Panel.Boole(spacing, f0, f1, f2, f3, f4);
            p1 = Next(nodes[first + 1], _momentumSum + Panel.Integral(1, spacing, f0, f1, f2, f3, f4), ref worst);
            p2 = Next(nodes[first + 2], _momentumSum + Panel.Integral(2, spacing, f0, f1, f2, f3, f4), ref worst);
            p3 = Next(nodes[first + 3], _momentumSum + Panel.Integral(3, spacing, f0, f1, f2, f3, f4), ref worst);
            p4 = Next(nodes[first + 4], sum, ref worst);
            if (double.IsNaN(worst)) return new(length, Trouble(nodes[first + 1]) ?? Trouble(nodes[first + 4]) ?? Choked);
            if (worst > sweepTolerance) continue;
            for (int j = 1; j <= Panel.Intervals; j++)
            {
                if (Trouble(nodes[first + j]) is { } trouble) return new(length, trouble);
            }

            // The last correction is too small to move anything but the pressure.
            (nodes[first + 1].Pressure, nodes[first + 2].Pressure, nodes[first + 3].Pressure, nodes[first + 4].Pressure) = (p1, p2, p3, p4);
            _known = new(first, spacing, 0);
            return Judge(piece, length, sum, f0, f1, f2, f3, f4);
        }

        return new(length, Choked);
    }

    private readonly Attempt Judge(in Piece piece, double length, double sum, double f0, double f1, double f2, double f3, double f4)
    {
        int first = Count - 1;
        double spacing = length / Panel.Intervals, area = _ducts[piece.Duct].Area;
        double d0 = Nodes[first].Density, d1 = Nodes[first + 1].Density, d2 = Nodes[first + 2].Density, d3 = Nodes[first + 3].Density, d4 = Nodes[first + 4].Density;
        double pressureError = Math.Abs(Panel.Boole(spacing, f0, f1, f2, f3, f4) - Panel.Simpson(spacing, f0, f1, f2, f3, f4));
        double massError = area * Math.Abs(Panel.Boole(spacing, d0, d1, d2, d3, d4) - Panel.Simpson(spacing, d0, d1, d2, d3, d4));

        // By length, and a little for the short panels near a phase boundary.
        double allowed = _tolerance * ((length / TotalLength) + 0.002);
        double quality = Math.Min(allowed * OutletPressure / (pressureError + double.Epsilon), allowed * _massScale / (massError + double.Epsilon));
        return new(length, null) { MomentumSum = sum, PressureError = pressureError, MassError = massError, Quality = quality };
    }

    // The polynomial through the nodes of the panel before, or of one that was too long; the slope where there are none. A long reach
    // would blow up the round-off of a quartic.
    private readonly double Guess(double distance, double length)
    {
        if (_known.Spacing == 0) return Last.Pressure + (distance * Last.Loss);
        ReadOnlySpan<PassNode> nodes = Nodes.AsSpan(_known.First, Panel.Intervals + 1);
        double at = _known.Offset + (distance / _known.Spacing);
        return length > 1.5 * Panel.Intervals * _known.Spacing
            ? Panel.Parabola(at - 2, nodes[2].Pressure, nodes[3].Pressure, nodes[4].Pressure)
            : Panel.Quartic(at, nodes[0].Pressure, nodes[1].Pressure, nodes[2].Pressure, nodes[3].Pressure, nodes[4].Pressure);
    }

    // The sweep before was at the same enthalpy.
    private readonly void Place(in Piece piece, int index, double done, double pressure, int sweep) =>
        Place(index, piece.Duct, piece.End - done, pressure, piece.EnthalpyAt(done), piece.LinearHeatAt(done), sweep > 0 ? Nodes[index].Temperature : 0);

    // Newton for p + G² vM(p) = sum, with vM ~ 1/p.
    private readonly double Next(in PassNode node, double sum, ref double worst)
    {
        double momentum = Momentum(node), pressure = node.Pressure;
        double change = (sum - momentum - pressure) / (1 - (momentum / pressure));
        double relative = IsChoked(momentum, pressure) ? double.NaN : Math.Abs(change) / pressure;
        worst = double.IsNaN(worst) || relative <= worst ? worst : relative;
        return pressure + change;
    }

    /// <summary>Distance up the piece at which a phase ends inside the panel just tried; null if none does.</summary>
    private readonly Crossing? CrossingIn(in Attempt attempt, in Piece piece)
    {
        int first = Count - 1;
        double start = Nodes[first].EquilibriumQuality;
        double reference = Math.Abs(start) < OnBoundary || Math.Abs(start - 1) < OnBoundary ? Nodes[first + 1].EquilibriumQuality : start;
        for (int j = 1; j <= Panel.Intervals; j++)
        {
            double quality = Nodes[first + j].EquilibriumQuality;

            // Where a phase ends on the way to this node; the node's own quality if none does.
            double phaseEnd = reference <= 0 ? Math.Min(quality, 0) : reference >= 1 ? Math.Max(quality, 1) : Math.Min(Math.Max(quality, 0), 1);
            if (!(Math.Abs(quality - phaseEnd) > BoundaryTolerance)) continue;

            double before = Nodes[first + j - 1].EquilibriumQuality - phaseEnd, after = quality - phaseEnd, spacing = attempt.Length / Panel.Intervals;
            double share = before / (before - after);
            if (j > 1) share += share * (1 - share) * (Nodes[first + j - 2].EquilibriumQuality - phaseEnd - (2 * before) + after) / (2 * (after - before));
            double distance = spacing * (j - 1 + share);
            return distance > 1e-12 * piece.Length ? new(distance, phaseEnd) : null;
        }

        return null;
    }

    /// <summary>The panel that ends exactly where the phase does, by the secant method.</summary>
    private Attempt Aim(in Piece piece, double done, Crossing crossing, double tried)
    {
        double length = Math.Min(crossing.Distance, piece.Length - done);
        for (int i = 0; i < GreatestAims; i++)
        {
            Attempt attempt = Try(piece, done, length, LeastSweepTolerance);
            if (attempt.Trouble is not null) return attempt;
            double end = Nodes[Count - 1 + Panel.Intervals].EquilibriumQuality - crossing.Boundary;
            double before = Nodes[Count - 2 + Panel.Intervals].EquilibriumQuality - crossing.Boundary;
            double change = end * (length / Panel.Intervals) / (before - end);
            if (Math.Abs(end) <= BoundaryTolerance || double.IsNaN(change) || Math.Abs(change) < 1e-14 * piece.Length) return attempt with { AtBoundary = true };
            length = Math.Min(Math.Max(length + change, length / 4), piece.Length - done);
        }

        return Try(piece, done, tried, _sweepTolerance);
    }

    private readonly record struct Crossing(double Distance, double Boundary);

    /// <summary>Five nodes whose pressures are known, and where among them the last accepted one stands; none while the spacing is zero.</summary>
    private readonly record struct KnownNodes(int First, double Spacing, int Offset);

    /// <summary>A panel tried: what is wrong with it, or how good it is.</summary>
    private readonly record struct Attempt(double Length, string? Trouble)
    {
        public double MomentumSum { get; init; }

        public double PressureError { get; init; }

        public double MassError { get; init; }

        /// <summary>Allowed error over error found.</summary>
        public double Quality { get; init; }

        /// <summary>It ends where a phase does.</summary>
        public bool AtBoundary { get; init; }
    }
}
