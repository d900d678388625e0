using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A place in a document, by its JSON path; everything read through it fails with that path.</summary>
internal readonly struct Place(string path)
{
    public static Place Root => new("$");

    public Place Member(string name) => new($"{path}.{name}");

    public Place Item(int index) => new($"{path}[{index.ToString(System.Globalization.CultureInfo.InvariantCulture)}]");

    public DocumentException Fault(string message, Exception? inner = null) => new(path, message, inner);

    /// <summary>What a constructor of the library makes; its complaint gets the path.</summary>
    public T Make<T>(Func<T> make)
    {
        try
        {
            return make();
        }
        catch (Exception error) when (error is ArgumentException or FormatException)
        {
            throw Fault(OneLine(error), error);
        }
    }

    public T Required<T>(T? value)
        where T : class => value ?? throw Fault("is missing");

    public T Required<T>(T? value)
        where T : struct => value ?? throw Fault("is missing");

    public double Quantity(string? text, UnitKind kind, UnitBasis? basis = null)
    {
        string given = Required(text);
        return Make(() => QuantityText.Parse(given, kind, basis ?? UnitBasis.None));
    }

    public Length Length(string? text) => UnitsNet.Length.FromMeters(Quantity(text, UnitKind.Length));

    // .NET adds the parameter's name, which says nothing to somebody who writes a file.
    private static string OneLine(Exception error)
    {
        string message = error.Message;
        if (error is ArgumentException { ParamName: { Length: > 0 } })
        {
            int end = message.LastIndexOf(" (Parameter '", StringComparison.Ordinal);
            if (end < 0) end = message.LastIndexOf(Environment.NewLine + "Parameter name", StringComparison.Ordinal);
            if (end > 0) message = message[..end];
        }

        return message.TrimEnd('.');
    }
}
