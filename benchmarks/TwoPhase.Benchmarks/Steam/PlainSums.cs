namespace TwoPhase.Benchmarks.Steam;

/// <summary>
/// Regions 1 and 2 as printed: each of the six sums of R7-97(2012) by itself, two calls of Math.Pow to a term. What the library
/// is compared with, nothing more.
/// </summary>
internal static class PlainSums
{
    private const double GasConstant = 461.526;

    // R7-97(2012), Table 2.
    private static readonly int[] I1 =
    [
        0, 0, 0, 0, 0, 0, 0, 0, 1, 1, 1, 1, 1, 1, 2, 2, 2, 2, 2, 3, 3, 3, 4, 4, 4, 5, 8, 8, 21, 23, 29, 30, 31, 32,
    ];

    private static readonly int[] J1 =
    [
        -2, -1, 0, 1, 2, 3, 4, 5, -9, -7, -1, 0, 1, 3, -3, 0, 1, 3, 17, -4, 0, 6, -5, -2, 10, -8, -11, -6, -29, -31, -38, -39,
        -40, -41,
    ];

    private static readonly double[] N1 =
    [
        0.14632971213167, -0.84548187169114, -0.37563603672040e1, 0.33855169168385e1, -0.95791963387872, 0.15772038513228,
        -0.16616417199501e-1, 0.81214629983568e-3, 0.28319080123804e-3, -0.60706301565874e-3, -0.18990068218419e-1,
        -0.32529748770505e-1, -0.21841717175414e-1, -0.52838357969930e-4, -0.47184321073267e-3, -0.30001780793026e-3,
        0.47661393906987e-4, -0.44141845330846e-5, -0.72694996297594e-15, -0.31679644845054e-4, -0.28270797985312e-5,
        -0.85205128120103e-9, -0.22425281908000e-5, -0.65171222895601e-6, -0.14341729937924e-12, -0.40516996860117e-6,
        -0.12734301741641e-8, -0.17424871230634e-9, -0.68762131295531e-18, 0.14478307828521e-19, 0.26335781662795e-22,
        -0.11947622640071e-22, 0.18228094581404e-23, -0.93537087292458e-25,
    ];

    // R7-97(2012), Tables 10 and 11.
    private static readonly int[] J0 =
    [
        0, 1, -5, -4, -3, -2, -1, 2, 3,
    ];

    private static readonly double[] N0 =
    [
        -0.96927686500217e1, 0.10086655968018e2, -0.56087911283020e-2, 0.71452738081455e-1, -0.40710498223928,
        0.14240819171444e1, -0.43839511319450e1, -0.28408632460772, 0.21268463753307e-1,
    ];

    private static readonly int[] I2 =
    [
        1, 1, 1, 1, 1, 2, 2, 2, 2, 2, 3, 3, 3, 3, 3, 4, 4, 4, 5, 6, 6, 6, 7, 7, 7, 8, 8, 9, 10, 10, 10, 16, 16, 18, 20, 20,
        20, 21, 22, 23, 24, 24, 24,
    ];

    private static readonly int[] J2 =
    [
        0, 1, 2, 3, 6, 1, 2, 4, 7, 36, 0, 1, 3, 6, 35, 1, 2, 3, 7, 3, 16, 35, 0, 11, 25, 8, 36, 13, 4, 10, 14, 29, 50, 57, 20,
        35, 48, 21, 53, 39, 26, 40, 58,
    ];

    private static readonly double[] N2 =
    [
        -0.0017731742473212999, -0.017834862292357999, -0.045996013696365003, -0.057581259083432, -0.050325278727930002,
        -3.3032641670203e-5, -0.00018948987516315, -0.0039392777243355001, -0.043797295650572998, -2.6674547914087001e-5,
        2.0481737692308999e-8, 4.3870667284435001e-7, -3.2277677238570002e-5, -0.0015033924542148, -0.040668253562648998,
        -7.8847309559367001e-10, 1.2790717852285001e-8, 4.8225372718507002e-7, 2.2922076337661001e-6, -1.6714766451061001e-11,
        -0.0021171472321354998, -23.895741934103999, -5.9059564324270004e-18, -1.2621808899101e-6, -0.038946842435739003,
        1.1256211360459e-11, -8.2311340897998004, 1.9809712802088e-8, 1.0406965210174e-19, -1.0234747095929e-13,
        -1.0018179379511e-9, -8.0882908646984998e-11, 0.10693031879409, -0.33662250574170999, 8.9185845355420999e-25,
        3.0629316876231997e-13, -4.2002467698208001e-6, -5.9056029685639003e-26, 3.7826947613457002e-6, -1.2768608934681e-15,
        7.3087610595061e-29, 5.5414715350778001e-17, -9.4369707241209998e-7,
    ];

    /// <summary>h + v + cp + w² of region 1, so that all six sums are used.</summary>
    public static double Region1(double pressure, double temperature)
    {
        double pi = pressure / 16.53e6, tau = 1386 / temperature, a = 7.1 - pi, b = tau - 1.222;
        double g = 0, gp = 0, gpp = 0, gt = 0, gtt = 0, gpt = 0;
        for (int k = 0; k < N1.Length; k++) g += N1[k] * Math.Pow(a, I1[k]) * Math.Pow(b, J1[k]);
        for (int k = 0; k < N1.Length; k++) gp -= N1[k] * I1[k] * Math.Pow(a, I1[k] - 1) * Math.Pow(b, J1[k]);
        for (int k = 0; k < N1.Length; k++) gpp += N1[k] * I1[k] * (I1[k] - 1) * Math.Pow(a, I1[k] - 2) * Math.Pow(b, J1[k]);
        for (int k = 0; k < N1.Length; k++) gt += N1[k] * Math.Pow(a, I1[k]) * J1[k] * Math.Pow(b, J1[k] - 1);
        for (int k = 0; k < N1.Length; k++) gtt += N1[k] * Math.Pow(a, I1[k]) * J1[k] * (J1[k] - 1) * Math.Pow(b, J1[k] - 2);
        for (int k = 0; k < N1.Length; k++) gpt -= N1[k] * I1[k] * Math.Pow(a, I1[k] - 1) * J1[k] * Math.Pow(b, J1[k] - 1);
        return Sum(pressure, temperature, pi, tau, (g, gp, gpp, gt, gtt, gpt));
    }

    /// <summary>h + v + cp + w² of region 2, so that all six sums are used.</summary>
    public static double Region2(double pressure, double temperature)
    {
        double pi = pressure / 1e6, tau = 540 / temperature, b = tau - 0.5;
        double g = Math.Log(pi), gp = 1 / pi, gpp = -1 / (pi * pi), gt = 0, gtt = 0, gpt = 0;
        for (int k = 0; k < N0.Length; k++) g += N0[k] * Math.Pow(tau, J0[k]);
        for (int k = 0; k < N0.Length; k++) gt += N0[k] * J0[k] * Math.Pow(tau, J0[k] - 1);
        for (int k = 0; k < N0.Length; k++) gtt += N0[k] * J0[k] * (J0[k] - 1) * Math.Pow(tau, J0[k] - 2);
        for (int k = 0; k < N2.Length; k++) g += N2[k] * Math.Pow(pi, I2[k]) * Math.Pow(b, J2[k]);
        for (int k = 0; k < N2.Length; k++) gp += N2[k] * I2[k] * Math.Pow(pi, I2[k] - 1) * Math.Pow(b, J2[k]);
        for (int k = 0; k < N2.Length; k++) gpp += N2[k] * I2[k] * (I2[k] - 1) * Math.Pow(pi, I2[k] - 2) * Math.Pow(b, J2[k]);
        for (int k = 0; k < N2.Length; k++) gt += N2[k] * Math.Pow(pi, I2[k]) * J2[k] * Math.Pow(b, J2[k] - 1);
        for (int k = 0; k < N2.Length; k++) gtt += N2[k] * Math.Pow(pi, I2[k]) * J2[k] * (J2[k] - 1) * Math.Pow(b, J2[k] - 2);
        for (int k = 0; k < N2.Length; k++) gpt += N2[k] * I2[k] * Math.Pow(pi, I2[k] - 1) * J2[k] * Math.Pow(b, J2[k] - 1);
        return Sum(pressure, temperature, pi, tau, (g, gp, gpp, gt, gtt, gpt));
    }

    private static double Sum(double pressure, double temperature, double pi, double tau, (double G, double P, double PP, double T, double TT, double PT) d)
    {
        double volume = GasConstant * temperature * pi * d.P / pressure;
        double enthalpy = GasConstant * temperature * tau * d.T;
        double entropy = GasConstant * ((tau * d.T) - d.G);
        double heatCapacity = -GasConstant * tau * tau * d.TT;
        double expansion = d.P - (tau * d.PT);
        double squaredSpeed = GasConstant * temperature * d.P * d.P / ((expansion * expansion / (tau * tau * d.TT)) - d.PP);
        return volume + enthalpy + entropy + heatCapacity + squaredSpeed;
    }
}
