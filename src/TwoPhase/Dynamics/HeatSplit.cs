using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Dynamics;

/// <summary>Scheduled shares of the absorbed heat: of the convection bank, or of single sections. Whatever is not named keeps its proportions and takes the rest.</summary>
/// <remarks>Immutable. A curve starts at NaN where nothing is scheduled yet: there the share is the pass's own.</remarks>
internal sealed class HeatSplit
{
    private readonly (string? Section, TimeCurve Share)[] _shares;

    private HeatSplit((string? Section, TimeCurve Share)[] shares) => _shares = shares;

    public static HeatSplit OfThePass { get; } = new([]);

    /// <summary>Time of the last change [s].</summary>
    public double End => _shares.Length == 0 ? 0 : _shares.Max(share => share.Share.End);

    /// <summary>The share of a section in time; of the convection bank where the name is null.</summary>
    public TimeCurve Of(string? section)
    {
        int at = Array.FindIndex(_shares, share => share.Section == section);
        return at < 0 ? TimeCurve.Constant(double.NaN) : _shares[at].Share;
    }

    public HeatSplit With(string? section, TimeCurve share, string parameter) =>
        _shares.Any(other => other.Section is null != section is null)
            ? throw new ArgumentException("The shares of the convection bank and of single sections cannot both be scheduled: a section would have two.", parameter)
            : new([.. _shares.Where(other => other.Section != section), (section, share)]);

    /// <summary>The factors on the shares of a pass.</summary>
    /// <exception cref="ArgumentException">The pass cannot be split like that.</exception>
    public Factors For(Pass pass, string parameter) => new(pass, _shares, parameter);

    /// <summary>By what the share of each duct of one pass is multiplied, in time.</summary>
    public sealed class Factors
    {
        private readonly Group[] _groups;
        private readonly double _restShare;
        private readonly double[] _factors;
        private readonly string _parameter;

        public Factors(Pass pass, (string? Section, TimeCurve Share)[] shares, string parameter)
        {
            _parameter = parameter;
            _factors = new double[pass.Ducts.Length];
            _groups = [.. shares.Select(share => GroupOf(pass, share.Section, share.Share, parameter))];
            _restShare = 1 - _groups.Sum(group => group.OwnShare);
            if (_groups.Length > 0 && _restShare < 1e-9) throw new ArgumentException($"The heat shares of all heated sections of pass '{pass.Name}' are scheduled: one must be left to take the rest.", parameter);
        }

        /// <summary>The factors for the mean shares over an interval; valid until the next call.</summary>
        public ReadOnlySpan<double> Over(double from, double to)
        {
            double given = 0;
            foreach (Group group in _groups) given += group.Share.Mean(from, to);
            if (given > 1) throw Require.OutOfRange(given, "Sum of the scheduled heat shares", Scale.None, _parameter, $"must not exceed 1 at {Scale.Seconds.Text(to)}");
            _factors.AsSpan().Fill((1 - given) / _restShare);
            foreach (Group group in _groups)
            {
                double factor = group.Share.Mean(from, to) / group.OwnShare;
                foreach (int duct in group.Ducts) _factors[duct] = factor;
            }

            return _factors;
        }

        private static Group GroupOf(Pass pass, string? section, TimeCurve share, string parameter)
        {
            string what = section is null ? "convection bank" : $"section '{section}'";
            int[] ducts = [.. Enumerable.Range(0, pass.Sections.Count).Where(i => section is null ? pass.Sections[i].Zone == HeatZone.Convective : pass.Sections[i].Name == section)];
            double own = ducts.Sum(i => pass.Ducts[i].HeatShare);
            return own > 0
                ? new(ducts, own, share.StartingAt(own))
                : throw new ArgumentException($"A heat share of the {what} is scheduled, but pass '{pass.Name}' has none that takes heat.", parameter);
        }

        private readonly record struct Group(int[] Ducts, double OwnShare, TimeCurve Share);
    }
}
