using System.Globalization;
using System.Reflection;
using System.Text;
using TwoPhase.Friction;
using TwoPhase.HeatTransfer;
using TwoPhase.Metering;
using TwoPhase.Slip;

namespace Docs;

/// <summary>One family of correlations: its page.</summary>
/// <param name="File">Name of the page.</param>
/// <param name="Title">Its title.</param>
/// <param name="Lead">What the family gives.</param>
/// <param name="Types">The abstract types of the family.</param>
/// <param name="Spreads">What its members give at a typical pass condition.</param>
internal sealed record Family(string File, string Title, string Lead, Type[] Types, IReadOnlyList<Spread> Spreads)
{
    public static IReadOnlyList<Family> All { get; } =
    [
        new("wet-steam", "Wet-steam models", "What the differential of a meter says of the quality that flows through it. The models disagree by more than any instrument error: fit the site's own constant to tests.", [typeof(WetSteamModel)], [Typical.WetSteam]),
        new("void-fraction", "Void fraction", "How much of the tube the steam fills; the water held in a pass hangs on it.", [typeof(VoidFractionModel)], [Typical.VoidFraction]),
        new("friction", "Friction", "Pressure lost to friction per metre of tube.", [typeof(FrictionModel)], [Typical.Friction]),
        new("film", "Film coefficients", "Heat transfer between wall and flow.", [typeof(FilmModel)], [Typical.Film]),
        new("critical-quality", "Critical quality", "The quality at which the wall dries out. Outside their range of diameters, where most evaporator tubes are, these are indicators and say so.", [typeof(CriticalQualityModel)], [Typical.CriticalQuality]),
        new("onset", "Onset of boiling and net vapour", "Where the first bubbles stand, and where the flow begins to carry them.", [typeof(OnsetModel), typeof(NetVapourModel)], [Typical.Onset, Typical.NetVapour]),
    ];

    public IReadOnlyList<PropertyInfo> Models => [.. Types.SelectMany(ModelsOf)];

    public string PictureFile(int index) => string.Create(CultureInfo.InvariantCulture, $"{File}-{index}.svg");

    public string Page()
    {
        var page = new StringBuilder();
        page.AppendLine($"# {Title}").AppendLine().AppendLine(Lead).AppendLine();
        for (int i = 0; i < Spreads.Count; i++) page.AppendLine($"![{Spreads[i].Caption}]({PictureFile(i)})").AppendLine().AppendLine($"*{Spreads[i].Caption}. Drawn also where a model is outside its published range.*").AppendLine();
        page.AppendLine("| model | range | accuracy | source |").AppendLine("|---|---|---|---|");
        foreach (PropertyInfo model in Models)
        {
            Notes notes = Notes.Of(model);
            page.AppendLine($"| [{model.GetValue(null)}](xref:{model.DeclaringType!.FullName}.{model.Name}) | {Cell(notes.Range)} | {Cell(notes.Accuracy)} | {Cell(notes.Source)} |");
        }

        page.AppendLine().AppendLine("The equation and every symbol of a model stand on its page of the API, one click on its name away. A model of your own is one class: see the pattern there.");
        return page.ToString();
    }

    // In the order of the family's own index, as in the picture.
    private static IEnumerable<PropertyInfo> ModelsOf(Type type)
    {
        var all = ((System.Collections.IEnumerable)type.GetProperty("All")!.GetValue(null)!).Cast<object>().ToList();
        return type.GetProperties(BindingFlags.Public | BindingFlags.Static | BindingFlags.DeclaredOnly)
            .Where(property => property.PropertyType == type && property.Name != "Default")
            .OrderBy(property => all.IndexOf(property.GetValue(null)!));
    }

    private static string Cell(string text) => text.Replace("|", "\\|", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal);
}
