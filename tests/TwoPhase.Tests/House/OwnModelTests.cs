namespace TwoPhase.Tests.House;

/// <summary>Models written as a user writes them: compiled apart, against the public surface of the library only.</summary>
public class OwnModelTests
{
    [Fact]
    public void Models_WrittenOutsideTheLibrary_AnswerLikeBuiltInOnes()
    {
        string printed = Compiler.Run("""
            using TwoPhase.Flow; using TwoPhase.Friction; using TwoPhase.Slip; using TwoPhase.Steam; using UnitsNet;
            var flow = new TwoPhaseFlow(Saturation.FromPressure(Pressure.FromMegapascals(10)), MassFraction.FromPercent(78),
                MassFlux.FromKilogramsPerSecondPerSquareMeter(1000), Length.FromMillimeters(78), Angle.Zero);

            VoidFractionModel own = new CubeRootSlip(), zivi = VoidFractionModel.Zivi;
            Console.WriteLine(own.VoidFraction(flow) == zivi.VoidFraction(flow));
            Console.WriteLine(Math.Abs(own.SlipRatio(flow) / zivi.SlipRatio(flow) - 1) < 1e-12);
            Console.WriteLine(Math.Abs(own.Quality(flow, own.VoidFraction(flow)).Percent - 78) < 1e-9);
            Console.WriteLine(own.Check(flow));

            Console.WriteLine(VoidFractionModel.DriftFlux(new Flat(), new Still()).VoidFraction(flow) == VoidFractionModel.Homogeneous.VoidFraction(flow));

            FrictionModel straight = new StraightLine();
            Console.WriteLine(straight.Gradient(flow, Length.FromMicrometers(46)) > PressureGradient.FromPascalsPerMetre(0));
            Console.WriteLine(straight.Check(flow));

            sealed class CubeRootSlip : VoidFractionModel
            {
                public override string Name => "my own";
                protected override double VoidFractionCore(in FlowState flow) => VoidFractionFromSlip(flow, Math.Cbrt(flow.LiquidDensity / flow.VapourDensity));
                protected override Applicability CheckCore(in FlowState flow) => Applicability.Inside.Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.1e6, 9e6);
            }

            sealed class Flat : DistributionParameter { public override string Name => "flat"; protected override double Core(in FlowState flow) => 1; }

            sealed class Still : DriftVelocity { public override string Name => "still"; protected override double Core(in FlowState flow) => 0; }

            sealed class StraightLine : FrictionModel
            {
                public override string Name => "straight";
                protected override double GradientCore(in FlowState flow, double roughness) =>
                    (1 - flow.Quality) * LiquidOnly(flow, roughness) + flow.Quality * VapourOnly(flow, roughness);
            }
            """);
        Assert.Equal("True\nTrue\nTrue\noutside its range: Pressure (1E+07, limits 100000 to 9E+06)\nTrue\nTrue\ninside its range", printed);
    }
}
