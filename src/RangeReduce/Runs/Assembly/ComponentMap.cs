using RangeReduce.Quantities;
using RangeReduce.Runs.Manifest;

namespace RangeReduce.Runs.Assembly;

/// <summary>Says which component of the field a recorded channel is.</summary>
/// <remarks>Without a statement, H is along theta and V along phi, and channels called theta, phi, right or left are what they are called.</remarks>
internal sealed class ComponentMap
{
    private static readonly (string Channel, FieldComponent Component)[] Headings =
    [
        ("theta", FieldComponent.Theta), ("phi", FieldComponent.Phi), ("right", FieldComponent.Right), ("left", FieldComponent.Left),
    ];

    private static readonly (string Channel, FieldComponent Component)[] Assumed = [("h", FieldComponent.Theta), ("v", FieldComponent.Phi)];

    private readonly Dictionary<string, (FieldComponent Component, bool IsTurned, bool IsAssumed)> _map = new(StringComparer.OrdinalIgnoreCase);
    private readonly ManifestProbe? _probe;

    /// <summary>Takes the statements of the manifest, where there are any.</summary>
    public ComponentMap(ManifestProbe? probe)
    {
        _probe = probe;
        foreach (var (channel, component) in Headings)
        {
            _map[channel] = (component, false, false);
        }

        foreach (var (channel, component) in Assumed.Where(_ => probe?.Theta is null))
        {
            _map[channel] = (component, false, true);
        }

        Put(probe?.Theta, FieldComponent.Theta);
        Put(probe?.Phi, FieldComponent.Phi);
        Put(probe?.Right, FieldComponent.Right);
        Put(probe?.Left, FieldComponent.Left);
    }

    /// <summary>Gets the names of all channels that are known.</summary>
    public IEnumerable<string> Known => _map.Keys;

    /// <summary>Looks a channel up.</summary>
    /// <param name="channel">Name of the channel; case does not matter.</param>
    /// <returns>Its component, whether its sign is to be turned, and whether this rests on an assumption; null where the channel is not known.</returns>
    public (FieldComponent Component, bool IsTurned, bool IsAssumed)? Of(string channel) => _map.TryGetValue(channel.Trim(), out var found) ? found : null;

    /// <summary>Gives the conventions for the record.</summary>
    /// <param name="time">Time factor of the manifest; null where it states none.</param>
    /// <param name="usedAssumed">Whether a channel was mapped by assumption.</param>
    /// <param name="usedHeadings">Whether a channel was mapped by a heading that names the component.</param>
    public PolarizationConventions Conventions(TimeFactor? time, bool usedAssumed, bool usedHeadings)
    {
        var stated = _probe is { Theta: not null } or { Right: not null };
        var byHeading = !stated && !usedAssumed && usedHeadings;
        return new()
        {
            Time = time ?? TimeFactor.PlusJ,
            TimeFrom = time is null ? "assumed" : Planning.Assignment.ByManifest,
            ThetaPort = _probe?.Theta ?? (byHeading ? "theta" : "H"),
            PhiPort = _probe?.Phi ?? (byHeading ? "phi" : "V"),
            PortsFrom = stated ? Planning.Assignment.ByManifest : byHeading ? "headings" : "assumed",
        };
    }

    private void Put(string? port, FieldComponent component)
    {
        if (port is not null)
        {
            _map[ProbePort.NameOf(port)] = (component, ProbePort.IsTurned(port), false);
        }
    }
}
