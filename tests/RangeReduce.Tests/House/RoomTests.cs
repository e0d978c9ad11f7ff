using System.Reflection;
using RangeReduce.Quantities;

namespace RangeReduce.Tests.House;

/// <summary>Holds the arrows of the house: a room may use the rooms before it, never one after it.</summary>
public sealed class RoomTests
{
    private static readonly string[][] Floors =
    [
        ["Diagnostics"], ["Quantities", "Numerics"], ["Networks", "Patterns"], ["Runs"], ["Corrections"], ["Reduction"], ["Uncertainties"], ["Comparison"],
    ];

    [Fact]
    public void No_room_uses_a_room_on_a_higher_floor()
    {
        var offences =
            from type in typeof(Figure).Assembly.GetTypes()
            let floor = FloorOf(type)
            where floor >= 0
            from used in TypesUsedBy(type)
            where FloorOf(used) > floor
            select $"{type.FullName} uses {used.FullName}";
        Assert.Empty(offences.Distinct(StringComparer.Ordinal));
    }

    [Fact]
    public void Every_type_lives_in_a_known_room_or_at_the_front_door()
    {
        var strangers =
            from type in typeof(Figure).Assembly.GetTypes()
            where type.Namespace is { } space && space.StartsWith("RangeReduce.", StringComparison.Ordinal) && FloorOf(type) < 0
            select type.FullName;
        Assert.Empty(strangers);
    }

    private static int FloorOf(Type type)
    {
        const string Root = "RangeReduce.";
        if (type.Namespace is not { } space || !space.StartsWith(Root, StringComparison.Ordinal))
        {
            return -1;
        }

        var room = space[Root.Length..].Split('.')[0];
        return Array.FindIndex(Floors, floor => floor.Contains(room, StringComparer.Ordinal));
    }

    private static IEnumerable<Type> TypesUsedBy(Type type)
    {
        const BindingFlags All = BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;
        var fields = type.GetFields(All).Select(field => field.FieldType);
        var methods = type.GetMethods(All).Cast<MethodBase>().Concat(type.GetConstructors(All)).ToArray();
        var signatures = methods.SelectMany(method => method.GetParameters().Select(parameter => parameter.ParameterType).Append((method as MethodInfo)?.ReturnType ?? typeof(void)));
        var bodies = methods.SelectMany(method => method.GetMethodBody()?.LocalVariables.Select(local => local.LocalType) ?? []);
        var called = methods.SelectMany(MethodBodyReader.TypesNamedIn);
        return fields.Concat(signatures).Concat(bodies).Concat(called).Concat(type.GetInterfaces()).Append(type.BaseType ?? typeof(object)).SelectMany(Unwrapped);
    }

    private static IEnumerable<Type> Unwrapped(Type type)
    {
        if (type.HasElementType)
        {
            return Unwrapped(type.GetElementType()!);
        }

        return type.IsGenericType ? type.GetGenericArguments().SelectMany(Unwrapped).Append(type) : [type];
    }
}
