namespace TwoPhase.Passes;

/// <summary>A flux shape made ready for the solvers: piecewise linear over 0 to 1, scaled to mean 1.</summary>
internal sealed class FluxCurve
{
    private FluxCurve(double[] position, double[] flux)
    {
        Position = position;
        Flux = flux;
    }

    public static FluxCurve Uniform { get; } = new([0, 1], [1, 1]);

    /// <summary>Positions of the corners, the first 0, the last 1.</summary>
    public double[] Position { get; }

    /// <summary>Flux over mean flux at the corners.</summary>
    public double[] Flux { get; }

    public int Pieces => Position.Length - 1;

    public static FluxCurve Through(FluxPoint[] points, string section, string parameter)
    {
        double[] position = Array.ConvertAll(points, point => point.RawPosition), flux = Array.ConvertAll(points, point => point.RelativeFlux);
        if (position.Length < 2 || position[0] != 0 || position[^1] != 1) throw new ArgumentException($"The flux shape of section '{section}' must begin at 0 and end at 1.", parameter);
        double mean = 0;
        for (int i = 1; i < position.Length; i++)
        {
            if (position[i] <= position[i - 1]) throw new ArgumentException($"The positions of the flux shape of section '{section}' must rise.", parameter);
            mean += (position[i] - position[i - 1]) * (flux[i] + flux[i - 1]) / 2;
        }

        if (mean <= 0) throw new ArgumentException($"The flux shape of section '{section}' is zero everywhere.", parameter);
        return new(position, Array.ConvertAll(flux, value => value / mean));
    }

    /// <summary>Share of the section's heat taken up before a position, 0 to 1.</summary>
    public double Cumulated(double position)
    {
        double sum = 0;
        for (int i = 0; i < Pieces && Position[i] < position; i++)
        {
            double length = Math.Min(position, Position[i + 1]) - Position[i];
            double slope = (Flux[i + 1] - Flux[i]) / (Position[i + 1] - Position[i]);
            sum += length * (Flux[i] + (slope * length / 2));
        }

        return sum;
    }
}
