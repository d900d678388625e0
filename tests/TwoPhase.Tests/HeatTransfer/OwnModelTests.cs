using TwoPhase.Tests.House;

namespace TwoPhase.Tests.HeatTransfer;

/// <summary>A model of the user's own, compiled as a program outside the library and without its friends' rights.</summary>
public class OwnModelTests
{
    [Fact]
    public void Models_WrittenOutsideTheLibrary_WorkLikeOurs() => Assert.Equal(
        """
        own film: 20000 W/(m²·K), wall 5 K above saturation, inside its range
        own dryout: 55 %, top 45 %, indicator False
        own onset: 1 K
        own departure: -0.5 %
        """.ReplaceLineEndings("\n"),
        Compiler.Run(
            """
            using System.Globalization;
            using TwoPhase.Flow;
            using TwoPhase.HeatTransfer;
            using TwoPhase.Steam;
            using UnitsNet;

            CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
            Saturation steam = Saturation.FromPressure(Pressure.FromMegapascals(10));
            var flow = new TwoPhaseFlow(steam, MassFraction.FromPercent(50), MassFlux.FromKilogramsPerSecondPerSquareMeter(1000), Length.FromMillimeters(78), Angle.Zero);
            HeatFlux q = HeatFlux.FromKilowattsPerSquareMeter(100);

            FilmModel film = new OwnFilm();
            Console.WriteLine($"{film}: {film.Coefficient(flow, q).WattsPerSquareMeterKelvin:F0} W/(m²·K), wall {film.SurfaceTemperature(flow, q).Kelvins - steam.Temperature.Kelvins:F0} K above saturation, {film.Check(flow, q)}");
            CriticalQuality critical = new OwnDryout().Critical(flow, q);
            Console.WriteLine($"own dryout: {critical.Mean.Percent:F0} %, top {critical.Top.Percent:F0} %, indicator {critical.IsIndicatorOnly}");
            Console.WriteLine($"own onset: {new OwnOnset().Superheat(flow, q).Kelvins:F0} K");
            Console.WriteLine($"own departure: {new OwnDeparture().DepartureQuality(flow, q).Percent:F1} %");

            sealed class OwnFilm : FilmModel
            {
                public override string Name => "own film";
                protected override double CoefficientCore(in FlowState flow, double heatFlux) => 10e3 * (1 + 2 * flow.Quality);
            }

            sealed class OwnDryout : CriticalQualityModel
            {
                public override string Name => "own dryout";
                protected override double MeanCore(in FlowState flow, double heatFlux) => 0.65 - heatFlux / 1e6;
                protected override double SpreadCore(in FlowState flow, double mean) => 0.2;
            }

            sealed class OwnOnset : OnsetModel
            {
                public override string Name => "own onset";
                protected override double SuperheatCore(in FlowState flow, double heatFlux) => heatFlux / 1e5;
            }

            sealed class OwnDeparture : NetVapourModel
            {
                public override string Name => "own departure";
                protected override double SubcoolingCore(in FlowState flow, double heatFlux) => 0.005 * flow.LatentHeat;
            }
            """));
}
