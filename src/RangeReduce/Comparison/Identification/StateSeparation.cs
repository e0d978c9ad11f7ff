namespace RangeReduce.Comparison.Identification;

/// <summary>How well two states can be told apart within a band, the cable being as free as the options say.</summary>
/// <param name="FirstState">One state.</param>
/// <param name="SecondState">The other state.</param>
/// <param name="LowHz">Lower end of the band in hertz.</param>
/// <param name="HighHz">Upper end of the band in hertz.</param>
/// <param name="Distance">Least distance of the states over the standard deviation of the noise in one sweep, the noise of the signatures taken out.</param>
/// <param name="ErrorProbability">Probability to take one for the other by the smaller distance, the noise of the sweep and of the signatures counted.</param>
public sealed record StateSeparation(string FirstState, string SecondState, double LowHz, double HighHz, double Distance, double ErrorProbability);
