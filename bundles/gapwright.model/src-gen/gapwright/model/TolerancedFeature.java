/**
 */
package gapwright.model;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Toleranced Feature</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * A value that may have a tolerance.
 * <!-- end-model-doc -->
 * @see gapwright.model.GapwrightPackage#getTolerancedFeature()
 * @model
 * @generated
 */
public enum TolerancedFeature implements Enumerator {
	/**
	 * The '<em><b>GAP LENGTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #GAP_LENGTH_VALUE
	 * @generated
	 * @ordered
	 */
	GAP_LENGTH(0, "GAP_LENGTH", "GAP_LENGTH"),

	/**
	 * The '<em><b>WIDTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #WIDTH_VALUE
	 * @generated
	 * @ordered
	 */
	WIDTH(1, "WIDTH", "WIDTH"),

	/**
	 * The '<em><b>DEPTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #DEPTH_VALUE
	 * @generated
	 * @ordered
	 */
	DEPTH(2, "DEPTH", "DEPTH"),

	/**
	 * The '<em><b>DIAMETER</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #DIAMETER_VALUE
	 * @generated
	 * @ordered
	 */
	DIAMETER(3, "DIAMETER", "DIAMETER"),

	/**
	 * The '<em><b>AREA</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #AREA_VALUE
	 * @generated
	 * @ordered
	 */
	AREA(4, "AREA", "AREA"),

	/**
	 * The '<em><b>PATH LENGTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #PATH_LENGTH_VALUE
	 * @generated
	 * @ordered
	 */
	PATH_LENGTH(5, "PATH_LENGTH", "PATH_LENGTH"),

	/**
	 * The '<em><b>STACKING FACTOR</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #STACKING_FACTOR_VALUE
	 * @generated
	 * @ordered
	 */
	STACKING_FACTOR(6, "STACKING_FACTOR", "STACKING_FACTOR"),

	/**
	 * The '<em><b>MAGNET LENGTH</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #MAGNET_LENGTH_VALUE
	 * @generated
	 * @ordered
	 */
	MAGNET_LENGTH(7, "MAGNET_LENGTH", "MAGNET_LENGTH"),

	/**
	 * The '<em><b>REMANENCE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #REMANENCE_VALUE
	 * @generated
	 * @ordered
	 */
	REMANENCE(8, "REMANENCE", "REMANENCE"),

	/**
	 * The '<em><b>PERMEABILITY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #PERMEABILITY_VALUE
	 * @generated
	 * @ordered
	 */
	PERMEABILITY(9, "PERMEABILITY", "PERMEABILITY"),

	/**
	 * The '<em><b>SATURATION</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #SATURATION_VALUE
	 * @generated
	 * @ordered
	 */
	SATURATION(10, "SATURATION", "SATURATION"),

	/**
	 * The '<em><b>CURRENT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #CURRENT_VALUE
	 * @generated
	 * @ordered
	 */
	CURRENT(11, "CURRENT", "CURRENT");

	/**
	 * The '<em><b>GAP LENGTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #GAP_LENGTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int GAP_LENGTH_VALUE = 0;

	/**
	 * The '<em><b>WIDTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #WIDTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int WIDTH_VALUE = 1;

	/**
	 * The '<em><b>DEPTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #DEPTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int DEPTH_VALUE = 2;

	/**
	 * The '<em><b>DIAMETER</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #DIAMETER
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int DIAMETER_VALUE = 3;

	/**
	 * The '<em><b>AREA</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #AREA
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int AREA_VALUE = 4;

	/**
	 * The '<em><b>PATH LENGTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #PATH_LENGTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int PATH_LENGTH_VALUE = 5;

	/**
	 * The '<em><b>STACKING FACTOR</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #STACKING_FACTOR
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int STACKING_FACTOR_VALUE = 6;

	/**
	 * The '<em><b>MAGNET LENGTH</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #MAGNET_LENGTH
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int MAGNET_LENGTH_VALUE = 7;

	/**
	 * The '<em><b>REMANENCE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #REMANENCE
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int REMANENCE_VALUE = 8;

	/**
	 * The '<em><b>PERMEABILITY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #PERMEABILITY
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int PERMEABILITY_VALUE = 9;

	/**
	 * The '<em><b>SATURATION</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #SATURATION
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int SATURATION_VALUE = 10;

	/**
	 * The '<em><b>CURRENT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #CURRENT
	 * @model
	 * @generated
	 * @ordered
	 */
	public static final int CURRENT_VALUE = 11;

	/**
	 * An array of all the '<em><b>Toleranced Feature</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final TolerancedFeature[] VALUES_ARRAY =
		new TolerancedFeature[] {
			GAP_LENGTH,
			WIDTH,
			DEPTH,
			DIAMETER,
			AREA,
			PATH_LENGTH,
			STACKING_FACTOR,
			MAGNET_LENGTH,
			REMANENCE,
			PERMEABILITY,
			SATURATION,
			CURRENT,
		};

	/**
	 * A public read-only list of all the '<em><b>Toleranced Feature</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<TolerancedFeature> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Toleranced Feature</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static TolerancedFeature get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			TolerancedFeature result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Toleranced Feature</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static TolerancedFeature getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			TolerancedFeature result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Toleranced Feature</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static TolerancedFeature get(int value) {
		switch (value) {
			case GAP_LENGTH_VALUE: return GAP_LENGTH;
			case WIDTH_VALUE: return WIDTH;
			case DEPTH_VALUE: return DEPTH;
			case DIAMETER_VALUE: return DIAMETER;
			case AREA_VALUE: return AREA;
			case PATH_LENGTH_VALUE: return PATH_LENGTH;
			case STACKING_FACTOR_VALUE: return STACKING_FACTOR;
			case MAGNET_LENGTH_VALUE: return MAGNET_LENGTH;
			case REMANENCE_VALUE: return REMANENCE;
			case PERMEABILITY_VALUE: return PERMEABILITY;
			case SATURATION_VALUE: return SATURATION;
			case CURRENT_VALUE: return CURRENT;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private TolerancedFeature(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //TolerancedFeature
