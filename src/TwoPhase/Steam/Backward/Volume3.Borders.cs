namespace TwoPhase.Steam.Backward;

// SR5-05(2016), Eqs. (1) to (3) with Tables 1 and 9: temperatures [K] of the borders between subregions, named after the
// subregions on either side, as functions of π = p / 1 MPa.
internal static partial class Volume3
{
    public static double Ab(double pi) =>
        Logarithmic(pi, 0.154793642129415e4, -0.187661219490113e3, 0.213144632222113e2, -0.191887498864292e4, 0.918419702359447e3);

    public static double Cd(double pi) =>
        Polynomial(pi, 0.585276966696349e3, 0.278233532206915e1, -0.127283549295878e-1, 0.159090746562729e-3, 0);

    // The straight line of slope dTs/dp at the critical point.
    public static double Ef(double pi) => (3.727888004 * (pi - 22.064)) + 647.096;

    public static double Gh(double pi) =>
        Polynomial(pi, -0.249284240900418e5, 0.428143584791546e4, -0.269029173140130e3, 0.751608051114157e1, -0.787105249910383e-1);

    public static double Ij(double pi) =>
        Polynomial(pi, 0.584814781649163e3, -0.616179320924617, 0.260763050899562, -0.587071076864459e-2, 0.515308185433082e-4);

    public static double Jk(double pi) =>
        Polynomial(pi, 0.617229772068439e3, -0.770600270141675e1, 0.697072596851896, -0.157391839848015e-1, 0.137897492684194e-3);

    public static double Mn(double pi) =>
        Polynomial(pi, 0.535339483742384e3, 0.761978122720128e1, -0.158365725441648, 0.192871054508108e-2, 0);

    public static double Op(double pi) =>
        Logarithmic(pi, 0.969461372400213e3, -0.332500170441278e3, 0.642859598466067e2, 0.773845935768222e3, -0.152313732937084e4);

    public static double Qu(double pi) =>
        Polynomial(pi, 0.565603648239126e3, 0.529062258221222e1, -0.102020639611016, 0.122240301070145e-2, 0);

    public static double Rx(double pi) =>
        Polynomial(pi, 0.584561202520006e3, -0.102961025163669e1, 0.243293362700452, -0.294905044740799e-2, 0);

    public static double Uv(double pi) =>
        Polynomial(pi, 0.528199646263062e3, 0.890579602135307e1, -0.222814134903755, 0.286791682263697e-2, 0);

    public static double Wx(double pi) =>
        Logarithmic(pi, 0.728052609145380e1, 0.973505869861952e2, 0.147370491183191e2, 0.329196213998375e3, 0.873371668682417e3);

    private static double Polynomial(double pi, double n0, double n1, double n2, double n3, double n4) =>
        n0 + (pi * (n1 + (pi * (n2 + (pi * (n3 + (pi * n4)))))));

    // Σ n (ln π)^I with I = 0, 1, 2, −1, −2 in the printed order.
    private static double Logarithmic(double pi, double n0, double n1, double n2, double m1, double m2)
    {
        double x = Math.Log(pi);
        return n0 + (x * (n1 + (x * n2))) + ((m1 + (m2 / x)) / x);
    }
}
