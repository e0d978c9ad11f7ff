namespace RangeReduce.Quantities;

/// <summary>The one place that knows what each quantity is called, how it is defined and how it is printed.</summary>
/// <remarks>A new figure of merit is one entry here and one reducer. Sources: IEEE Std 145 (definitions of terms for antennas), IEEE Std 149 (antenna measurements), IEEE Std 1597.1 (curve agreement).</remarks>
public static class QuantityCatalogue
{
    private const string Ieee145 = "IEEE Std 145";
    private const string Practice = "common practice";

    /// <summary>Frequency of a minimum of the reflection coefficient.</summary>
    public static readonly Quantity ResonanceFrequency = Frequency("resonance-frequency", "resonance frequency", "f_0", "Frequency at which the magnitude of the reflection coefficient has a minimum, refined between samples.", Practice);

    /// <summary>Return loss.</summary>
    public static readonly Quantity ReturnLoss = new("return-loss", "return loss", "RL", "dB", "Incident over reflected power at the port, −20 lg |Γ|; positive for a passive antenna.", Ieee145) { Preference = Preference.More };

    /// <summary>Voltage standing wave ratio.</summary>
    public static readonly Quantity Vswr = new("vswr", "voltage standing wave ratio", "VSWR", "1", "Largest over smallest voltage along a lossless line of the reference impedance, (1 + |Γ|)/(1 − |Γ|).", Ieee145) { Preference = Preference.Less };

    /// <summary>Mismatch loss.</summary>
    public static readonly Quantity MismatchLoss = new("mismatch-loss", "mismatch loss", "L_m", "dB", "Available over accepted power for a generator of the reference impedance, −10 lg (1 − |Γ|²).", Ieee145) { Decimals = 3, Preference = Preference.Less };

    /// <summary>Input resistance.</summary>
    public static readonly Quantity InputResistance = new("input-resistance", "input resistance", "R", "ohm", "Real part of the impedance at the antenna port.", Ieee145) { PrintUnit = "Ω", Decimals = 1 };

    /// <summary>Input reactance.</summary>
    public static readonly Quantity InputReactance = new("input-reactance", "input reactance", "X", "ohm", "Imaginary part of the impedance at the antenna port.", Ieee145) { PrintUnit = "Ω", Decimals = 1 };

    /// <summary>Real part of the reflection coefficient (trace only).</summary>
    public static readonly Quantity ReflectionReal = new("reflection-real", "reflection coefficient, real part", "Re Γ", "1", "Real part of the reflection coefficient at the port.", Practice) { Decimals = 4 };

    /// <summary>Imaginary part of the reflection coefficient (trace only).</summary>
    public static readonly Quantity ReflectionImaginary = new("reflection-imaginary", "reflection coefficient, imaginary part", "Im Γ", "1", "Imaginary part of the reflection coefficient at the port.", Practice) { Decimals = 4 };

    /// <summary>Quality factor.</summary>
    public static readonly Quantity QualityFactor = new("quality-factor", "quality factor", "Q", "1", "Quality factor of the tuned antenna from the frequency derivative of its impedance.", "Yaghjian and Best, IEEE Trans. AP 53(4), 2005") { Decimals = 1 };

    /// <summary>Width of a match band.</summary>
    public static readonly Quantity MatchBand = Frequency("match-band", "match band", "B", "Width of the connected run of frequencies over which the return loss is at least the threshold.", Practice) with { Preference = Preference.More, Decimals = 1, PrintUnit = "MHz", PrintFactor = 1e-6 };

    /// <summary>Match band over its centre.</summary>
    public static readonly Quantity MatchBandFraction = new("match-band-fraction", "match band over centre frequency", "B/f_c", "%", "Width of the match band over the arithmetic mean of its edges.", Practice) { Preference = Preference.More };

    /// <summary>Isolation between ports.</summary>
    public static readonly Quantity Isolation = new("isolation", "isolation", "I", "dB", "Power into one port over power out of another, −20 lg |S_ij|; positive for a passive antenna.", Practice) { Preference = Preference.More };

    /// <summary>Received level, without gain standard.</summary>
    public static readonly Quantity Level = new("level", "level", "P", "dB", "Level of the component in the decibels of the file, with no reference to an isotropic antenna.", Practice);

    /// <summary>Gain.</summary>
    public static readonly Quantity Gain = new("gain", "gain", "G", "dBi", "Radiation intensity in the direction over that of an isotropic radiator fed with the same power; partial gain where a component is named, realized gain where the mismatch is in it.", Ieee145) { Preference = Preference.More };

    /// <summary>Direction of the maximum.</summary>
    public static readonly Quantity PeakDirection = new("peak-direction", "direction of the maximum", "θ_p", "deg", "Angle along the cut at which the level has its maximum, refined between samples.", Practice) { PrintUnit = "°", Decimals = 1 };

    /// <summary>Half-power beamwidth.</summary>
    public static readonly Quantity HalfPowerBeamwidth = new("half-power-beamwidth", "half-power beamwidth", "HPBW", "deg", "Angle between the two directions about the maximum at which the radiation intensity is half of it, in a plane that holds the maximum.", Ieee145) { PrintUnit = "°", Decimals = 1 };

    /// <summary>Sidelobe level.</summary>
    public static readonly Quantity SidelobeLevel = new("sidelobe-level", "sidelobe level", "SLL", "dB", "Level of the highest lobe other than the main lobe against the main lobe; negative.", Ieee145) { Decimals = 1, Preference = Preference.Less };

    /// <summary>Front-to-back ratio.</summary>
    public static readonly Quantity FrontToBackRatio = new("front-to-back-ratio", "front-to-back ratio", "F/B", "dB", "Level of the main lobe over the level 180 degrees from its peak.", Ieee145) { Decimals = 1, Preference = Preference.More };

    /// <summary>Axial ratio.</summary>
    public static readonly Quantity AxialRatio = new("axial-ratio", "axial ratio", "AR", "dB", "Major over minor axis of the polarization ellipse, in decibels, never negative; the hand is a figure of its own.", Ieee145) { Preference = Preference.Less };

    /// <summary>Tilt angle.</summary>
    public static readonly Quantity TiltAngle = new("tilt-angle", "tilt angle", "τ", "deg", "Angle of the major axis of the polarization ellipse from the theta direction towards the phi direction, above −90 and up to 90 degrees.", Ieee145) { PrintUnit = "°", Decimals = 1 };

    /// <summary>Hand.</summary>
    public static readonly Quantity Hand = new("hand", "hand", string.Empty, string.Empty, "Sense of polarization of the wave that the antenna transmits, judged looking along propagation: right, left or linear.", Ieee145);

    /// <summary>Cross-polar ratio.</summary>
    public static readonly Quantity CrossPolarRatio = new("cross-polar-ratio", "cross-polar ratio", "XPR", "dB", "Level of the co-polar over that of the cross-polar component in the same direction.", Practice) { Decimals = 1, Preference = Preference.More };

    /// <summary>Axial-ratio beamwidth.</summary>
    public static readonly Quantity AxialRatioBeamwidth = new("axial-ratio-beamwidth", "axial-ratio beamwidth", "ARBW", "deg", "Connected range of angles about the axis over which the axial ratio is at most the threshold.", Practice) { PrintUnit = "°", Decimals = 1, Preference = Preference.More };

    /// <summary>Axial-ratio band.</summary>
    public static readonly Quantity AxialRatioBand = Frequency("axial-ratio-band", "axial-ratio band", "B_AR", "Width of the connected run of frequencies over which the axial ratio on the axis is at most the threshold.", Practice) with { Preference = Preference.More, Decimals = 1, PrintUnit = "MHz", PrintFactor = 1e-6 };

    /// <summary>Directivity.</summary>
    public static readonly Quantity Directivity = new("directivity", "directivity", "D", "dBi", "Radiation intensity in the direction over the mean of it over all directions.", Ieee145) { Preference = Preference.More };

    /// <summary>Radiation efficiency.</summary>
    public static readonly Quantity RadiationEfficiency = new("radiation-efficiency", "radiation efficiency", "η", "%", "Radiated over accepted power, the ratio of gain to directivity.", Ieee145) { Decimals = 1, Preference = Preference.More };

    /// <summary>Switching contrast.</summary>
    public static readonly Quantity SwitchingContrast = new("switching-contrast", "switching contrast", "C", "dB", "Level of one hand on the axis in one state over the level of the same hand in another state.", "defined here") { Decimals = 1, Preference = Preference.More };

    /// <summary>Switching reduction.</summary>
    public static readonly Quantity SwitchingReduction = new("switching-reduction", "switching reduction", "r", "%", "The switching contrast as a share of power, 1 − 10^(−C/10).", "defined here") { Decimals = 1, Preference = Preference.More };

    /// <summary>Deviation of measured from simulated.</summary>
    public static readonly Quantity Deviation = new("deviation", "deviation", "Δ", "1", "Measured minus simulated, in the unit of the quantity that it is of.", "defined here");

    /// <summary>Frequency scale.</summary>
    public static readonly Quantity FrequencyScale = new("frequency-scale", "frequency scale", "s", "1", "Factor on the frequency axis that best lays the simulated curve on the measured one.", "defined here") { Decimals = 5 };

    /// <summary>Curve agreement.</summary>
    public static readonly Quantity CurveAgreement = new("curve-agreement", "curve agreement", "GDM", "1", "Global difference measure of Feature Selective Validation; 0 is identity.", "IEEE Std 1597.1") { Decimals = 3, Preference = Preference.Less };

    /// <summary>Match band that the quality factor predicts.</summary>
    public static readonly Quantity PredictedMatchBand = Frequency("predicted-match-band", "match band from the quality factor", "B_Q", "Width of the match band that the quality factor of an isolated resonance predicts, f_0 · 2√β/Q with √β = g/√(1 − g²) and g the reflection coefficient of the threshold.", "Yaghjian and Best, IEEE Trans. AP 53(4), 2005") with { Decimals = 1, PrintUnit = "MHz", PrintFactor = 1e-6 };

    /// <summary>Envelope correlation.</summary>
    public static readonly Quantity EnvelopeCorrelation = new("envelope-correlation", "envelope correlation", "ρ_e", "1", "Square of the correlation of the far fields of two ports, from the scattering parameters; holds for lossless antennas in a uniform, unpolarized surrounding.", "Blanch, Romeu and Corbella, Electron. Lett. 39, 2003") { Decimals = 4, Preference = Preference.Less };

    /// <summary>Gain band.</summary>
    public static readonly Quantity GainBand = Frequency("gain-band", "gain band", "B_G", "Width of the connected run of frequencies about the highest gain on the axis over which the gain is at most the threshold below it.", Practice) with { Preference = Preference.More, Decimals = 1, PrintUnit = "MHz", PrintFactor = 1e-6 };

    /// <summary>Beam squint.</summary>
    public static readonly Quantity BeamSquint = new("beam-squint", "beam squint", "δ", "deg", "Signed angle along the cut from the stated axis to the beam: to the maximum or to the middle of the half-power directions.", Ieee145) { PrintUnit = "°", Decimals = 1 };

    /// <summary>Polarization efficiency.</summary>
    public static readonly Quantity PolarizationEfficiency = new("polarization-efficiency", "polarization efficiency", "p", "dB", "Power that an antenna of the one polarization takes from a wave of the other over what a matched one would take; never positive.", Ieee145);

    private static readonly Quantity[] Entries =
    [
        ResonanceFrequency, ReturnLoss, Vswr, MismatchLoss, InputResistance, InputReactance, QualityFactor, MatchBand, MatchBandFraction, Isolation,
        Level, Gain, PeakDirection, HalfPowerBeamwidth, SidelobeLevel, FrontToBackRatio, AxialRatio, TiltAngle, Hand, CrossPolarRatio,
        AxialRatioBeamwidth, AxialRatioBand, Directivity, RadiationEfficiency, SwitchingContrast, SwitchingReduction, Deviation, FrequencyScale,
        CurveAgreement, ReflectionReal, ReflectionImaginary, PredictedMatchBand, EnvelopeCorrelation, GainBand, BeamSquint, PolarizationEfficiency,
    ];

    private static readonly Dictionary<string, Quantity> ById = Entries.ToDictionary(entry => entry.Id, StringComparer.Ordinal);

    /// <summary>Gets all quantities, in the order in which a report lists them.</summary>
    public static IReadOnlyList<Quantity> All => Entries;

    /// <summary>Looks a quantity up by its id.</summary>
    /// <param name="id">The id, in lower case.</param>
    /// <param name="quantity">The quantity; null if there is none of this id.</param>
    public static bool TryGet(string id, [System.Diagnostics.CodeAnalysis.NotNullWhen(true)] out Quantity? quantity) => ById.TryGetValue(id, out quantity);

    private static Quantity Frequency(string id, string name, string symbol, string definition, string source) =>
        new(id, name, symbol, "Hz", definition, source) { PrintUnit = "GHz", PrintFactor = 1e-9, Decimals = 4 };
}
